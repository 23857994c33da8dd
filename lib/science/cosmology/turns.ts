import { brent } from '../numeric/brent'
import { minimum } from '../numeric/minimum'
import type { Density } from './density'

const STEP = 0.1
/** ln(1+z) of the largest redshift looked at: before z = 1e9 electrons and positrons annihilate. */
export const DEEPEST_X = Math.log(1e9)
/** ln(1+z) of the furthest future looked at: the universe some 10^13 times larger. */
export const FURTHEST_X = -30
/** Below this E^2 at its minimum, in units of its largest term, the model rests on the static limit. */
const STATIC = 1e-11

/** The first place going away from now where the expansion stops, or rests for ever. */
export interface Turn {
  /** ln(1+z). */
  readonly x: number
  readonly kind: 'turn' | 'static'
}

/**
 * Looks from now (x = 0) to `end` for the first zero of E^2. E^2 is a short sum of exponentials in x, so
 * between points 0.1 apart it can hide at most one dip, which is followed to its bottom.
 */
export function findTurn(density: Density, end: number): Turn | null {
  const direction = Math.sign(end)
  const f = (x: number): number => density.E2(x)
  const size = (x: number): number =>
    density.Om0 * Math.exp(3 * x) +
    Math.abs(density.Ok0) * Math.exp(2 * x) +
    density.radiation(x) +
    Math.abs(density.darkEnergy(x))
  let x1 = 0
  let f1 = f(0)
  let x0 = 0
  let f0 = f1
  const count = Math.ceil(Math.abs(end) / STEP)
  for (let i = 1; i <= count; i += 1) {
    const x2 = direction * Math.min(i * STEP, Math.abs(end))
    const f2 = f(x2)
    if (!Number.isFinite(f2)) return null
    if (f2 <= 0) return { x: brent(f, x1, x2, 1e-15), kind: 'turn' }
    if (f1 <= f0 && f1 <= f2 && i > 1) {
      const bottom = minimum(f, Math.min(x0, x2), Math.max(x0, x2))
      const depth = f(bottom)
      if (Math.abs(depth) <= STATIC * size(bottom)) return { x: bottom, kind: 'static' }
      if (depth < 0) return { x: brent(f, x0, bottom, 1e-15), kind: 'turn' }
    }
    x0 = x1
    f0 = f1
    x1 = x2
    f1 = f2
  }
  return null
}
