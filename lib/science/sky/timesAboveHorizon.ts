import { DEG_RAD } from '../constants'
import { SIDEREAL_DAY, TURN_DEG_PER_DAY } from './almanac'
import { arcsAbove } from './horizonCrossings'
import type { HorizonCurve } from './horizonCurve'
import { culmination } from './hourAngle'
import type { Interval } from './intervals'
import type { Observer } from './observer'
import type { Vector3 } from './vector'

/** Days a radian of hour angle takes. */
const DAYS = 1 / (DEG_RAD * TURN_DEG_PER_DAY)

/** When a direction of date stands above a horizon between two moments: its crossings turned into times. */
export function timesAboveHorizon(
  observer: Observer,
  vector: Vector3,
  curve: HorizonCurve,
  [from, to]: Interval,
): Interval[] {
  const [x, y, z] = vector
  const arcs = arcsAbove(curve, z / Math.sqrt(x * x + y * y + z * z))
  if (arcs === null) return [[from, to]]
  const found: Interval[] = []
  if (arcs.length === 0) return found
  // An arc may last for a whole turn and a half after the culmination it is counted from.
  let top = culmination(observer, vector, from) - 2 * SIDEREAL_DAY
  for (; top - SIDEREAL_DAY / 2 < to; top += SIDEREAL_DAY) {
    for (const [start, end] of arcs) {
      const low = Math.max(from, top + start * DAYS)
      const high = Math.min(to, top + end * DAYS)
      if (high > low) found.push([low, high])
    }
  }
  return found
}
