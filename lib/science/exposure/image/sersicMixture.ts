import { gaussLegendre } from '../../numeric/gaussLegendre'
import { slot } from '../../numeric/slot'
import { ScienceError } from '../../ScienceError'
import { mixtureOf, type Mixture } from './mixture'
import { halfLightRadius, scaled } from './widths'

export const SERSIC_LEAST = 0.5
export const SERSIC_MOST = 8

const rule = gaussLegendre(64)
const kept = new Map<number, Mixture>()

/**
 * Density of the one-sided stable law of index a, whose Laplace transform is exp(-s^a), times its argument:
 * the integral of Zolotarev (1986, One-dimensional Stable Distributions, theorem 2.4.2).
 */
function stableDensity(a: number, x: number): number {
  const power = x ** (-a / (1 - a))
  let sum = 0
  for (let i = 0; i < rule.nodes.length; i += 1) {
    const phi = 0.5 * Math.PI * (1 + slot(rule.nodes, i))
    const shape =
      (Math.sin((1 - a) * phi) * Math.sin(a * phi) ** (a / (1 - a))) / Math.sin(phi) ** (1 / (1 - a))
    if (Number.isFinite(shape)) sum += slot(rule.weights, i) * shape * Math.exp(-shape * power)
  }
  return (a / (1 - a)) * x ** (-1 / (1 - a)) * 0.5 * sum
}

/** The profile exp(-(r/r0)^(1/n)) as Gaussians of some scale: exp(-s^a) with s = r^2 and a = 1/2n is such a mixture. */
function unscaled(n: number): Mixture {
  const a = 1 / (2 * n)
  if (a > 0.97) return { shares: Float64Array.of(1), variances: Float64Array.of(1) }
  const lowest = (1 - a) * a ** (a / (1 - a))
  const from = Math.log(lowest / 45) * ((1 - a) / a)
  const step = Math.min(0.5, 1.2 * (1 - a))
  const parts = []
  for (let u = from; u < 16; u += step) {
    const x = Math.exp(u)
    parts.push({ share: stableDensity(a, x), variance: 1 / (2 * x) })
  }
  return mixtureOf(parts, 1e-6)
}

/**
 * A round Sersic profile (Sersic 1963; Graham & Driver 2005, PASA 22, 118) of index n and half-light radius,
 * arcseconds, as Gaussians. The index lies between 0.5 (a Gaussian) and 8; throws a ScienceError otherwise.
 */
export function sersicMixture(effectiveRadiusArcsec: number, n: number): Mixture {
  if (!(n >= SERSIC_LEAST && n <= SERSIC_MOST))
    throw new ScienceError('bad-source', `A Sérsic index lies between ${SERSIC_LEAST} and ${SERSIC_MOST}.`)
  if (!(effectiveRadiusArcsec > 0 && effectiveRadiusArcsec < 3600))
    throw new ScienceError('bad-source', 'A half-light radius lies above 0 and below 3,600 arcseconds.')
  let unit = kept.get(n)
  if (!unit) {
    const raw = unscaled(n)
    unit = scaled(raw, 1 / halfLightRadius(raw))
    if (kept.size > 64) kept.clear()
    kept.set(n, unit)
  }
  return scaled(unit, effectiveRadiusArcsec)
}
