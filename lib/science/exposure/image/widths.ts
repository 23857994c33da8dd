import { brent } from '../../numeric/brent'
import { slot } from '../../numeric/slot'
import { inCircle, surfaceShare, type Mixture } from './mixture'

const largest = ({ variances }: Mixture): number =>
  variances.reduce((high, variance) => Math.max(high, variance), 0)

/** Radius of half the light, arcseconds. */
export function halfLightRadius(mixture: Mixture): number {
  return brent((radius) => inCircle(mixture, radius) - 0.5, 0, 6 * Math.sqrt(largest(mixture)), 1e-10)
}

/** Full width at half maximum, arcseconds. */
export function fullWidth(mixture: Mixture): number {
  const half = surfaceShare(mixture, 0) / 2
  return 2 * brent((r) => surfaceShare(mixture, r) - half, 0, 3 * Math.sqrt(largest(mixture)), 1e-10)
}

/** The same image, larger or smaller by a factor. */
export function scaled({ shares, variances }: Mixture, factor: number): Mixture {
  return { shares, variances: Float64Array.from(variances, (variance) => variance * factor * factor) }
}

/** Light of one image spread by another: every Gaussian of one with every one of the other, alike ones put together. */
export function convolved(source: Mixture, point: Mixture): Mixture {
  const bins = new Map<number, { share: number; moment: number }>()
  for (let i = 0; i < source.shares.length; i += 1) {
    for (let j = 0; j < point.shares.length; j += 1) {
      const share = slot(source.shares, i) * slot(point.shares, j)
      const variance = slot(source.variances, i) + slot(point.variances, j)
      const key = Math.round(Math.log(variance) * BINS_PER_E_FOLD)
      const bin = bins.get(key) ?? { share: 0, moment: 0 }
      bin.share += share
      bin.moment += share * variance
      bins.set(key, bin)
    }
  }
  const parts = [...bins.values()]
  return {
    shares: Float64Array.from(parts, ({ share }) => share),
    variances: Float64Array.from(parts, ({ share, moment }) => moment / share),
  }
}

/** Variances within 1/8 of each other are one: the light inside any circle moves by less than 1e-4. */
const BINS_PER_E_FOLD = 8
