import { brent } from '../numeric/brent'
import { minimum } from '../numeric/minimum'
import type { Density } from './density'

const STEP = 0.1
/** ln(1+z) of the largest redshift looked at: before z = 1e9 electrons and positrons annihilate. */
export const DEEPEST_X = Math.log(1e9)
/** ln(1+z) of the furthest future looked at: the universe some 10^13 times larger. */
export const FURTHEST_X = -30
/** Below this E^2 at its minimum, in units of its terms, the model rests on the static limit. */
const STATIC = 1e-11
/** Below this E^2 nothing is left to count. */
const EMPTY = 1e-280

/** The first place going away from now where the expansion stops, or rests for ever. */
export interface Turn {
  /** ln(1+z). */
  readonly x: number
  readonly kind: 'turn' | 'static'
}

/** Sum of the terms of E^2 without their signs. */
function sizeOfTerms(density: Density, x: number): number {
  return (
    density.Om0 * Math.exp(3 * x) +
    Math.abs(density.Ok0) * Math.exp(2 * x) +
    density.radiation(x) +
    Math.abs(density.darkEnergy(x))
  )
}

/** Looks into a dip of E^2 between two points where it is above zero, nearer one first. */
function turnInDip(density: Density, near: number, far: number): Turn | null {
  const f = (x: number): number => density.E2(x)
  const bottom = minimum(f, Math.min(near, far), Math.max(near, far))
  const depth = f(bottom)
  if (Math.abs(depth) <= STATIC * sizeOfTerms(density, bottom)) return { x: bottom, kind: 'static' }
  return depth < 0 ? { x: brent(f, near, bottom, 1e-15), kind: 'turn' } : null
}

/**
 * Looks from now (x = 0) to `end` for the first zero of E^2. E^2 is a short sum of exponentials in x, so
 * between points 0.1 apart it can hide at most one dip, which is followed to its bottom.
 */
export function findTurn(density: Density, end: number): Turn | null {
  const direction = Math.sign(end)
  // Dark energy of negative density can plunge past any number between two points.
  const f = (x: number): number => Math.max(density.E2(x), -Number.MAX_VALUE)
  const count = Math.ceil(Math.abs(end) / STEP)
  let x0 = 0
  let x1 = 0
  let f1 = f(0)
  let falling = direction * density.slopeE2(0) < 0
  for (let i = 1; i <= count; i += 1) {
    const x2 = direction * Math.min(i * STEP, Math.abs(end))
    const f2 = f(x2)
    if (!Number.isFinite(f2)) return null
    // Everything has thinned out: the growth comes to rest without a turn.
    if (Math.abs(f2) < EMPTY && sizeOfTerms(density, x2) < EMPTY) return { x: x1, kind: 'static' }
    if (f2 <= 0) return { x: brent(f, x1, x2, 1e-15), kind: 'turn' }
    if (falling && f2 >= f1) {
      const turn = turnInDip(density, x0, x2)
      if (turn) return turn
    }
    falling = f2 < f1
    x0 = x1
    x1 = x2
    f1 = f2
  }
  return null
}
