import { SPEED_OF_LIGHT_KM_S } from '../constants'
import type { Cosmology } from '../cosmology'
import { ScienceError } from '../ScienceError'

const ARCSEC = 206_264.806

/**
 * Einstein radius of a singular isothermal sphere, arcseconds: 4 pi (sigma/c)^2 D_LS/D_S (Schneider, Ehlers & Falco
 * 1992, section 8.1.4), with the velocity dispersion in km/s. Throws a ScienceError unless the source lies behind.
 */
export function einsteinRadiusArcsec(
  cosmology: Cosmology,
  lens: { readonly z: number; readonly dispersionKmS: number },
  sourceZ: number,
): number {
  if (!(lens.z > 0 && sourceZ > lens.z))
    throw new ScienceError('bad-redshift', 'The source must lie behind the lens, and the lens at a distance.')
  if (!(lens.dispersionKmS > 0 && lens.dispersionKmS < 5000))
    throw new ScienceError('bad-parameter', 'A velocity dispersion lies above 0 and below 5,000 km/s.')
  const share = cosmology.angularDiameterBetweenMpc(lens.z, sourceZ) / cosmology.angularDiameterMpc(sourceZ)
  return 4 * Math.PI * (lens.dispersionKmS / SPEED_OF_LIGHT_KM_S) ** 2 * share * ARCSEC
}

/**
 * Magnitudes a lens makes a source brighter by, and their error, from a magnification and its error. The area grows
 * by as much, so the surface brightness stays. Throws a ScienceError for a magnification of 0 or less.
 */
export function magnifiedMag(magnification: number, error = 0): { magnitudes: number; error: number } {
  if (!(magnification > 0 && magnification < 1e4))
    throw new ScienceError('bad-parameter', 'A magnification lies above 0 and below 10,000.')
  if (!(error >= 0)) throw new ScienceError('bad-parameter', 'An error is 0 or more.')
  return {
    magnitudes: 2.5 * Math.log10(magnification),
    error: ((2.5 / Math.LN10) * error) / magnification,
  }
}
