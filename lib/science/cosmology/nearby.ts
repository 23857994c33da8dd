import { SPEED_OF_LIGHT_KM_S } from '../constants'
import { ScienceError } from '../ScienceError'
import { sayRedshift } from './redshiftCheck'
import { cmbRedshift, heliocentricRedshift, type SkyPosition } from './solarMotion'
import type { Cosmology } from './types'

/** Usual speed of a galaxy besides the expansion, km/s, one component. */
export const USUAL_PECULIAR_KM_S = 300

/** Below this CMB-frame redshift a distance is to be measured, not computed. */
export const NEARBY_REDSHIFT = 0.01

export interface NearbyInput extends SkyPosition {
  readonly redshift: number
  /** What the redshift refers to. */
  readonly frame: 'heliocentric' | 'cmb'
  /** Standard error of the redshift; 0 unless given. */
  readonly redshiftError?: number
  /** Standard deviation of the galaxy's own motion along the line of sight, km/s; 300 unless given. */
  readonly peculiarKmS?: number
}

export interface NearbyDistance {
  readonly zHeliocentric: number
  readonly zCmb: number
  readonly luminosityMpc: number
  /** One standard deviation, from motion and from the redshift's own error in quadrature. */
  readonly luminosityErrorMpc: number
  readonly distanceModulusMag: number
  readonly distanceModulusErrorMag: number
  /** The error over the distance. */
  readonly errorShare: number
  /** False where the redshift is no measure of distance. */
  readonly trusted: boolean
  /** Why not, and what to give instead; null where it is trusted. */
  readonly advice: string | null
}

const MEASURE =
  'Give a measured distance with its method, such as Cepheids, the tip of the red giant branch or surface brightness fluctuations.'

function refuseNegative(zHeliocentric: number, zCmb: number): void {
  if (zHeliocentric < 0)
    throw new ScienceError(
      'bad-redshift',
      `A negative redshift places lines, but gives no distance. ${MEASURE}`,
    )
  if (zCmb <= 0)
    throw new ScienceError(
      'bad-redshift',
      `Against the microwave background this redshift is ${sayRedshift(zCmb)}: motion, not expansion. ${MEASURE}`,
    )
}

function advise(zCmb: number, errorShare: number, peculiarKmS: number): string | null {
  if (zCmb >= NEARBY_REDSHIFT) return null
  const percent = `${(100 * errorShare).toFixed(0)}\u00a0%`
  return `At z = ${sayRedshift(zCmb)} against the microwave background, ${peculiarKmS}\u00a0km/s of a galaxy’s own motion leave its distance open by ${percent}. ${MEASURE}`
}

/**
 * Luminosity distance of a galaxy near by, where the Sun's motion and the galaxy's own are not small against
 * the expansion: D_L = (1 + z_hel) D_M(z_cmb) (Davis et al. 2011, ApJ 741, 67; Calcino & Davis 2017, JCAP 01, 038).
 *
 * A peculiar velocity v shifts the cosmological redshift by (1 + z_cmb) v/c, so that D_L shifts by
 * (1 + z_hel) dD_M/dz of that, with dD_M/dz = D_H/E sqrt(1 + Ok0 (D_M/D_H)^2). To first order: an error of more
 * than a third is a warning rather than a number.
 * Throws a ScienceError for a negative redshift, one that is motion alone, and one this universe does not have.
 */
export function nearbyDistance(cosmology: Cosmology, input: NearbyInput): NearbyDistance {
  const { redshiftError = 0, peculiarKmS = USUAL_PECULIAR_KM_S } = input
  if (!(redshiftError >= 0 && redshiftError < 1))
    throw new ScienceError('bad-parameter', 'The error of a redshift lies between 0 and 1.')
  if (!(peculiarKmS >= 0 && peculiarKmS <= 10_000))
    throw new ScienceError('bad-parameter', 'A peculiar velocity lies between 0 and 10 000 km/s.')
  const [zHeliocentric, zCmb] =
    input.frame === 'heliocentric'
      ? [input.redshift, cmbRedshift(input.redshift, input)]
      : [heliocentricRedshift(input.redshift, input), input.redshift]
  refuseNegative(zHeliocentric, zCmb)

  const transverse = cosmology.transverseComovingMpc(zCmb)
  const luminosityMpc = (1 + zHeliocentric) * transverse
  const bend = cosmology.Ok0 * (transverse / cosmology.hubbleDistanceMpc) ** 2
  const slope = (cosmology.hubbleDistanceMpc / cosmology.E(zCmb)) * Math.sqrt(Math.max(0, 1 + bend))
  const fromMotion = (1 + zHeliocentric) * slope * (((1 + zCmb) * peculiarKmS) / SPEED_OF_LIGHT_KM_S)
  // An error of the redshift moves both frames together, their factors of 1 + z alike.
  const both = input.frame === 'heliocentric' ? 1 : (1 + zHeliocentric) / (1 + zCmb)
  const fromRedshift = both * redshiftError * (transverse + (1 + zCmb) * slope)
  const luminosityErrorMpc = Math.hypot(fromMotion, fromRedshift)
  const errorShare = luminosityErrorMpc / luminosityMpc
  const advice = advise(zCmb, errorShare, peculiarKmS)
  return {
    zHeliocentric,
    zCmb,
    luminosityMpc,
    luminosityErrorMpc,
    distanceModulusMag: 5 * Math.log10(luminosityMpc) + 25,
    distanceModulusErrorMag: (5 / Math.LN10) * errorShare,
    errorShare,
    trusted: advice === null,
    advice,
  }
}
