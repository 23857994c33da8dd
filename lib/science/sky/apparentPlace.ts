import { DEG_RAD } from '../constants'
import { ScienceError } from '../ScienceError'
import type { Almanac } from './almanac'
import type { SkyTarget } from './types'
import { direction, dot, type Vector3 } from './vector'

const MAS_RAD = DEG_RAD / 3.6e6

/** Unit vector of a target at J2000 plus proper motion, ICRS. */
function astrometric(target: SkyTarget, years: number): Vector3 {
  const ra = target.raDeg * DEG_RAD
  const dec = target.decDeg * DEG_RAD
  const [x, y, z] = direction(ra, dec)
  const a = (target.pmRaMasYr ?? 0) * MAS_RAD * years
  const d = (target.pmDecMasYr ?? 0) * MAS_RAD * years
  if (a === 0 && d === 0) return [x, y, z]
  return [
    x - a * Math.sin(ra) - d * Math.sin(dec) * Math.cos(ra),
    y + a * Math.cos(ra) - d * Math.sin(dec) * Math.sin(ra),
    z + d * Math.cos(dec),
  ]
}

export function checkTarget(target: SkyTarget): void {
  if (!(target.raDeg >= 0 && target.raDeg < 360)) {
    throw new ScienceError('bad-coordinate', 'A right ascension lies between 0h and 24h, or 0° and 360°.')
  }
  if (!(Math.abs(target.decDeg) <= 90)) {
    throw new ScienceError('bad-coordinate', 'A declination lies between −90° and +90°.')
  }
}

/**
 * Apparent direction of a target on the true equator and equinox of date: proper motion, precession,
 * nutation and annual aberration. Not a unit vector to better than 1e-4. Within 0.5" of a full reduction.
 */
export function apparentVector(almanac: Almanac, target: SkyTarget, days: number): Vector3 {
  const p = astrometric(target, days / 365.25)
  const { rotation: r, velocity: v } = almanac.frame(days)
  return [dot(r[0], p) + v[0], dot(r[1], p) + v[1], dot(r[2], p) + v[2]]
}
