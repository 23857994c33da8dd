import { angleDeg, direction } from './vector'

const rad = Math.PI / 180

/** A place on the sky: right ascension and declination, degrees, ICRS. */
export interface Place {
  raDeg: number
  decDeg: number
}

/**
 * Angle between two places on the sky, arcseconds, 0 to 648,000. From the cross and the dot product of their unit
 * vectors, so that neither small angles nor opposite places lose digits: good to 1e-9 arcsec from 1e-6 arcsec upwards.
 */
export function separationArcsec(a: Place, b: Place): number {
  const [from, to] = [a, b].map(({ raDeg, decDeg }) => direction(raDeg * rad, decDeg * rad))
  return from && to ? angleDeg(from, to) * 3600 : NaN
}
