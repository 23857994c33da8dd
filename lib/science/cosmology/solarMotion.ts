import { DEG_RAD, SPEED_OF_LIGHT_KM_S } from '../constants'
import { ScienceError } from '../ScienceError'

/** Speed of the Sun through the microwave background, km/s: Planck Collaboration 2020, A&A 641, A1, table 3 (± 0.11). */
export const SOLAR_SPEED_KM_S = 369.82

/** Where the Sun is heading, galactic degrees: the same table (± 0.011, ± 0.005). */
const APEX_L_DEG = 264.021
const APEX_B_DEG = 48.253

/** Rows of the rotation from ICRS to galactic axes: ESA 1997, The Hipparcos and Tycho Catalogues 1, eq. 1.5.11. */
const GALACTIC = [
  [-0.0548755604, -0.8734370902, -0.4838350155],
  [0.4941094279, -0.44482963, 0.7469822445],
  [-0.867666149, -0.1980763734, 0.4559837762],
] as const

function direction(longitudeDeg: number, latitudeDeg: number): readonly [number, number, number] {
  const c = Math.cos(latitudeDeg * DEG_RAD)
  return [
    c * Math.cos(longitudeDeg * DEG_RAD),
    c * Math.sin(longitudeDeg * DEG_RAD),
    Math.sin(latitudeDeg * DEG_RAD),
  ]
}

const apex = direction(APEX_L_DEG, APEX_B_DEG)
/** The same direction along the axes of ICRS. */
const apexIcrs = [0, 1, 2].map((j) => apex.reduce((sum, part, i) => sum + part * (GALACTIC[i]?.[j] ?? 0), 0))

/** A position on the sky, ICRS degrees. */
export interface SkyPosition {
  readonly raDeg: number
  readonly decDeg: number
}

/**
 * 1 + z of the Sun's own motion for light from a position: below 1 towards the apex, which comes in bluer.
 * Exact in special relativity, for directions as the Sun sees them: gamma (1 - beta cos theta).
 */
function solarFactor({ raDeg, decDeg }: SkyPosition): number {
  if (!(raDeg >= 0 && raDeg <= 360))
    throw new ScienceError('bad-coordinate', 'A right ascension lies between 0 and 360 degrees.')
  if (!(Math.abs(decDeg) <= 90))
    throw new ScienceError('bad-coordinate', 'A declination lies between −90 and 90 degrees.')
  const towards = direction(raDeg, decDeg).reduce((sum, part, i) => sum + part * (apexIcrs[i] ?? 0), 0)
  const beta = SOLAR_SPEED_KM_S / SPEED_OF_LIGHT_KM_S
  return (1 - beta * towards) / Math.sqrt(1 - beta * beta)
}

function requireRedshift(z: number): void {
  if (!Number.isFinite(z)) throw new ScienceError('bad-redshift', 'A redshift must be a number.')
  if (z <= -1) throw new ScienceError('bad-redshift', 'A redshift lies above −1.')
}

/**
 * Redshift in the frame of the microwave background from the heliocentric one. Redshifts multiply as 1 + z and
 * do not add: Davis et al. 2011, ApJ 741, 67, eq. 5. Any z above -1; throws a ScienceError otherwise.
 */
export function cmbRedshift(zHeliocentric: number, position: SkyPosition): number {
  requireRedshift(zHeliocentric)
  const factor = solarFactor(position)
  return (zHeliocentric + (1 - factor)) / factor
}

/** The way back: heliocentric redshift from that in the frame of the microwave background. */
export function heliocentricRedshift(zCmb: number, position: SkyPosition): number {
  requireRedshift(zCmb)
  const factor = solarFactor(position)
  return zCmb * factor + (factor - 1)
}
