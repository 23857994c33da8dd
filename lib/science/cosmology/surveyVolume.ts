import { DEG_RAD } from '../constants'
import { integrate } from '../numeric/gaussLegendre'
import { ScienceError } from '../ScienceError'
import type { Cosmology } from './types'

/** The whole sky, square degrees: 4 pi steradians. */
const WHOLE_SKY_DEG2 = (4 * Math.PI) / DEG_RAD ** 2

/** Share of 1 + z under which a shell is so thin that the difference of two balls would lose digits. */
const THIN = 0.01

/** A piece of the sky between two redshifts. */
export interface Survey {
  /** Solid angle, square degrees, up to the whole sky: 41 252.96. */
  readonly solidAngleDeg2: number
  readonly zMin: number
  readonly zMax: number
}

/**
 * Comoving volume of a survey, Mpc^3: its share of the sky times the shell between two redshifts (Hogg 1999,
 * eq. 28 and 29), in any curvature and past the equator of closed space too.
 * Throws a ScienceError for a solid angle of more than the sky, redshifts out of order, and any redshift this
 * universe does not have.
 */
export function surveyVolumeMpc3(cosmology: Cosmology, { solidAngleDeg2, zMin, zMax }: Survey): number {
  if (!(solidAngleDeg2 > 0 && solidAngleDeg2 <= WHOLE_SKY_DEG2 * (1 + 1e-6)))
    throw new ScienceError(
      'bad-parameter',
      'A solid angle lies above 0 and within 41 252.96 square degrees, the whole sky.',
    )
  const near = cosmology.comovingVolumeMpc3(zMin)
  const far = cosmology.comovingVolumeMpc3(zMax)
  if (zMin > zMax)
    throw new ScienceError('bad-parameter', 'The nearer redshift of a survey comes before the farther.')
  const steradian = solidAngleDeg2 * DEG_RAD ** 2
  return zMax - zMin < THIN * (1 + zMin)
    ? steradian * integrate((z) => cosmology.differentialVolumeMpc3Sr(z), zMin, zMax)
    : (solidAngleDeg2 / WHOLE_SKY_DEG2) * (far - near)
}
