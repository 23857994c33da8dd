import { DEG_RAD } from '../constants'
import { SIDEREAL_DAY, TURN_DEG_PER_DAY } from './almanac'
import type { Interval } from './intervals'
import type { Observer } from './observer'
import type { Vector3 } from './vector'

/**
 * Half the time a direction spends above an altitude in one turn of the sky, degrees of hour angle: cos H =
 * (sin a - sin lat sin dec)/(cos lat cos dec). 0: never that high; 180: never lower.
 */
export function semiArcDeg(latitude: number, declination: number, altitudeDeg: number): number {
  const top = Math.sin(altitudeDeg * DEG_RAD) - Math.sin(latitude) * Math.sin(declination)
  const bottom = Math.cos(latitude) * Math.cos(declination)
  if (bottom <= 1e-12) return top <= 0 ? 180 : 0
  const cosH = top / bottom
  if (cosH >= 1) return 0
  if (cosH <= -1) return 180
  return Math.acos(cosH) / DEG_RAD
}

/** First upper culmination of a direction of date at or after `from`. */
export function culmination(observer: Observer, vector: Vector3, from: number): number {
  const rightAscension = Math.atan2(vector[1], vector[0]) / DEG_RAD
  const wait = (((rightAscension - observer.siderealDeg(from)) % 360) + 360) % 360
  return from + wait / TURN_DEG_PER_DAY
}

/** When a direction of date stands above an altitude between two moments, in closed form. */
export function timesAbove(
  observer: Observer,
  vector: Vector3,
  altitudeDeg: number,
  [from, to]: Interval,
): Interval[] {
  const declination = Math.atan2(vector[2], Math.hypot(vector[0], vector[1]))
  const semiArc = semiArcDeg(observer.latitude, declination, altitudeDeg)
  if (semiArc === 0) return []
  if (semiArc === 180) return [[from, to]]
  const half = semiArc / TURN_DEG_PER_DAY
  const found: Interval[] = []
  for (let top = culmination(observer, vector, from) - SIDEREAL_DAY; top - half < to; top += SIDEREAL_DAY) {
    const low = Math.max(from, top - half)
    const high = Math.min(to, top + half)
    if (high > low) found.push([low, high])
  }
  return found
}
