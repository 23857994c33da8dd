import { ScienceError } from '../ScienceError'
import type { Cosmology } from './types'

/** One moment of the expansion: Gyr from now (past negative), and size against now. */
export interface Moment {
  readonly gyrFromNow: number
  readonly scaleFactor: number
}

/**
 * Size of the universe against time, `points` moments of the growing phase evenly spaced in ln a between
 * scale factors `aFrom` and `aTo`, cut where the universe has no such size. Around a bounce or a greatest
 * size the motion is the same both ways, so the other phase is mirrored. Earliest first.
 */
export function expansionHistory(cosmology: Cosmology, aFrom: number, aTo: number, points: number): Moment[] {
  if (!(aFrom > 0 && aTo > aFrom && points >= 2)) {
    throw new ScienceError('bad-parameter', 'The sizes must rise from above 0, in at least two points.')
  }
  const { universe, deepestRedshift } = cosmology
  const smallest = 1 / (1 + deepestRedshift)
  const greatestAt = universe.origin === 'bounce' ? null : universe.turnaroundRedshift
  const largest = greatestAt === null ? Infinity : 1 / (1 + greatestAt)
  const low = Math.log(Math.max(aFrom, smallest))
  const high = Math.log(Math.min(aTo, largest))
  const turn = universe.turnaroundGyr ?? 0
  // Even in the square root near a turn, so that the curve stays round there.
  const grow: Moment[] = []
  for (let i = 0; i < points; i += 1) {
    const s = i / (points - 1)
    const bend = universe.origin === 'bounce' ? s * s : largest <= aTo ? 1 - (1 - s) ** 2 : s
    const scaleFactor = Math.exp(low + (high - low) * bend)
    const z = Math.min(1 / scaleFactor - 1, deepestRedshift)
    const gyrFromNow = 0 - cosmology.lookbackGyr(Math.max(z, greatestAt ?? z))
    grow.push({ gyrFromNow, scaleFactor })
  }
  if (universe.origin === 'bounce' && aFrom <= smallest) {
    const before = grow.slice(1).map((m) => ({ ...m, gyrFromNow: -2 * turn - m.gyrFromNow }))
    return [...before.reverse(), ...grow]
  }
  if (largest <= aTo) {
    const after = grow.slice(0, -1).map((m) => ({ ...m, gyrFromNow: 2 * turn - m.gyrFromNow }))
    return [...grow, ...after.reverse()]
  }
  return grow
}
