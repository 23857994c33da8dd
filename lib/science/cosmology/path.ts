import type { Density } from './density'
import { createIntegralTable } from './integralTable'

/** Pieces tables start from, in x: shorter where dark energy, matter and radiation take turns. */
const PIECE = 0.5
const SETTLED = 8
const LONG_PIECE = 2
/** Reach of the square-root variable around a turn, in x. */
const NEAR_TURN = 0.5

/** The integrand is exp(weight x)/E: weight 1 for distance, 0 for time. */
export type Weight = 0 | 1

/** Integral of exp(weight x)/E(x) from now (x = 0) to x, on one side of now, in Hubble units. */
export interface Path {
  /** The far end in x. */
  readonly end: number
  /** Integral from now to the far end. */
  readonly total: number
  /** Integral from now to x, for x between 0 and the end, both included. Negative towards the future. */
  read(x: number): number
}

/** Knots from 0 to `length`: every half unit at first, every two units past x = 8. */
export function knotsTo(length: number): number[] {
  const knots = [0]
  for (let s = PIECE; s < length; s += s < SETTLED ? PIECE : LONG_PIECE) knots.push(s)
  return [...knots, length]
}

/** A path that ends where nothing special happens. `end` may lie on either side of now. */
function plainPath(density: Density, weight: Weight, end: number): Path {
  const direction = end < 0 ? -1 : 1
  const g = (s: number): number => {
    const x = direction * s
    return Math.exp(weight * x) / Math.sqrt(density.E2(x))
  }
  const table = createIntegralTable(g, knotsTo(Math.abs(end)))
  return {
    end,
    total: direction * table.total,
    read: direction > 0 ? (x) => table.read(x) : (x) => -table.read(-x),
  }
}

/**
 * A path that ends at a turn, where E = 0 and the integrand has an inverse square root. In
 * u = sqrt(|end - x|) it is smooth, so the last stretch is kept in u, counted back from the turn.
 */
function turningPath(density: Density, weight: Weight, end: number): Path {
  const direction = end < 0 ? -1 : 1
  const length = Math.abs(end)
  // Never up to now: what is counted back from the turn has lost its relative accuracy by then.
  const near = Math.min(NEAR_TURN, 0.5 * length)
  const g = (s: number): number => {
    const x = direction * s
    return Math.exp(weight * x) / Math.sqrt(density.E2(x))
  }
  const gNear = (u: number): number => {
    const d = -direction * u * u
    return (2 * u * Math.exp(weight * (end + d))) / Math.sqrt(density.riseE2(end, d))
  }
  const far = createIntegralTable(g, knotsTo(length - near))
  const last = createIntegralTable(gNear, knotsTo(Math.sqrt(near)))
  const total = far.total + last.total
  return {
    end,
    total: direction * total,
    read(x) {
      const s = Math.min(direction * x, length)
      if (s <= 0) return 0
      if (s <= length - near) return direction * far.read(s)
      return direction * (total - last.read(Math.sqrt(length - s)))
    },
  }
}

/** Path from now to `end`, where the expansion turns or not. */
export function createPath(density: Density, weight: Weight, end: number, turns: boolean): Path {
  return turns ? turningPath(density, weight, end) : plainPath(density, weight, end)
}
