import type { ConstraintSet } from '../proposals/types'

/** What holds until someone says otherwise: the values the database would fill in. */
export const defaultConstraints: Omit<ConstraintSet, 'id' | 'version'> = {
  name: 'Conditions',
  maxAirmass: 1.8,
  imageQualityArcsec: 1.2,
  moon: 'any',
  minMoonSeparationDeg: 30,
  transparency: 'clear',
  dateFrom: null,
  dateTo: null,
  cadence: null,
}
