import { ScienceError } from '../ScienceError'
import type { Cosmology } from './types'

/** One moment of the expansion: Gyr from now (past negative), and size against now. */
export interface Moment {
  readonly gyrFromNow: number
  readonly scaleFactor: number
}

/**
 * Spreads the points evenly in ln a, or in its square root next to a turn, so that the curve stays round there.
 * Both runs over 0 to 1.
 */
function bend(s: number, turnsBelow: boolean, turnsAbove: boolean): number {
  if (turnsBelow && turnsAbove) return s * s * (3 - 2 * s)
  if (turnsBelow) return s * s
  return turnsAbove ? 1 - (1 - s) ** 2 : s
}

/**
 * Size of the universe against time, `points` moments of the growing phase spaced in ln a between scale factors
 * `aFrom` and `aTo`, cut where the universe has no such size. Around a bounce or a greatest size the motion is
 * the same both ways, so the other phase is mirrored; a universe that does both is shown shrinking, growing and
 * shrinking once. Earliest first. Where it ends in a big rip, the sizes run away at universe.ripInGyr.
 */
export function expansionHistory(cosmology: Cosmology, aFrom: number, aTo: number, points: number): Moment[] {
  if (!(aFrom > 0 && aTo > aFrom && aTo < Infinity && Number.isInteger(points) && points >= 2)) {
    throw new ScienceError('bad-parameter', 'The sizes must rise from above 0, in at least two points.')
  }
  const { universe, deepestRedshift, furthestRedshift } = cosmology
  const smallest = 1 / (1 + deepestRedshift)
  const largest = 1 / (1 + furthestRedshift)
  const turnsBelow = universe.origin === 'bounce' && aFrom <= smallest
  const turnsAbove = universe.greatestSizeInGyr !== null && largest <= aTo
  const low = Math.log(Math.max(aFrom, smallest))
  const high = Math.log(Math.min(aTo, largest))
  if (!(low < high))
    throw new ScienceError('bad-parameter', `${cosmology.parameters.name} never has any of these sizes.`)
  const grow: Moment[] = []
  for (let i = 0; i < points; i += 1) {
    const scaleFactor = Math.exp(low + (high - low) * bend(i / (points - 1), turnsBelow, turnsAbove))
    const z = Math.max(furthestRedshift, Math.min(1 / scaleFactor - 1, deepestRedshift))
    grow.push({ gyrFromNow: 0 - cosmology.lookbackGyr(z), scaleFactor })
  }
  const before = turnsBelow ? mirrored(grow.slice(1), cosmology.lookbackGyr(deepestRedshift) * -1) : []
  const after = turnsAbove ? mirrored(grow.slice(0, -1), universe.greatestSizeInGyr ?? 0) : []
  return [...before, ...grow, ...after]
}

/** The same sizes in the opposite order, on the other side of an instant. */
function mirrored(moments: readonly Moment[], aboutGyr: number): Moment[] {
  return moments.map((m) => ({ ...m, gyrFromNow: 2 * aboutGyr - m.gyrFromNow })).reverse()
}
