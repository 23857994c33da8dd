import { at } from '../numeric/at'
import { brent } from '../numeric/brent'
import { minimum } from '../numeric/minimum'
import { ScienceError } from '../ScienceError'
import type { Antipode } from './antipode'
import type { Timeline } from './timeline'
import type { CosmologyQuantity, InvertibleQuantity } from './types'

const STEPS = 300

/** A stretch of x = ln(1+z) on which a quantity only rises or only falls. */
interface Stretch {
  readonly low: number
  readonly high: number
}

/** Splits [0, end] at the turning points of f, found on an even grid and sharpened. */
function monotone(f: (x: number) => number, end: number): Stretch[] {
  const xs = Float64Array.from({ length: STEPS + 1 }, (_, i) => (end * i) / STEPS)
  const values = xs.map(f)
  const cuts = [0]
  for (let i = 1; i < STEPS; i += 1) {
    const left = at(values, i) - at(values, i - 1)
    const right = at(values, i + 1) - at(values, i)
    if (left * right < 0) {
      const sign = left > 0 ? -1 : 1
      cuts.push(minimum((x) => sign * f(x), at(xs, i - 1), at(xs, i + 1)))
    }
  }
  cuts.push(end)
  return cuts.slice(1).map((high, i) => ({ low: at(cuts, i), high }))
}

/**
 * Finds every redshift at which a quantity has a value. Distances seen across the sky rise and fall, so
 * there may be several; the stretches between extremes are found once and searched by Brent's method.
 */
export function createInverse(
  quantities: Record<CosmologyQuantity, (z: number) => number>,
  timeline: Timeline,
  antipode: Antipode,
): (quantity: InvertibleQuantity, value: number) => number[] {
  const stretches = new Map<InvertibleQuantity, Stretch[]>()

  return (quantity, value) => {
    if (!Number.isFinite(value)) {
      throw new ScienceError('bad-parameter', 'The value to look for must be a number.')
    }
    // The modulus is minus infinity at z = 0; its distance is not.
    if (quantity === 'distanceModulusMag') return search('luminosityMpc', 10 ** ((value - 25) / 5))
    return search(quantity, value)
  }

  function search(quantity: Exclude<InvertibleQuantity, 'distanceModulusMag'>, value: number): number[] {
    const across = quantity === 'luminosityMpc' || quantity === 'angularDiameterMpc'
    const far = across ? antipode.redshift() : null
    const end = far === null ? timeline.pastEnd : Math.log1p(far * (1 - 1e-12))
    const deepest = Math.expm1(end)
    const f = (x: number): number => quantities[quantity](Math.min(Math.expm1(x), deepest))
    const known = stretches.get(quantity) ?? monotone(f, end)
    stretches.set(quantity, known)
    const roots: number[] = []
    for (const { low, high } of known) {
      const fLow = f(low) - value
      const fHigh = f(high) - value
      if (fLow === 0) roots.push(low)
      else if (fHigh !== 0 && fLow > 0 !== fHigh > 0) roots.push(brent((x) => f(x) - value, low, high, 1e-16))
    }
    const last = known.at(-1)
    if (last && f(last.high) === value) roots.push(last.high)
    return roots.map((x) => Math.expm1(x))
  }
}
