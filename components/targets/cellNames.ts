import type { TargetRow } from '@/lib/domain/targets/schema'

/** What each cell is called in messages. */
export const cellNames: Record<keyof TargetRow, string> = {
  name: 'Name',
  ra: 'Right ascension',
  dec: 'Declination',
  redshift: 'Redshift',
  redshiftType: 'Kind of redshift',
  redshiftError: 'Error of the redshift',
  redshiftFrame: 'Frame of the redshift',
  magnitude: 'Magnitude',
  magnitudeError: 'Error of the magnitude',
  band: 'Band',
  provenance: 'Where the magnitude is from',
  source: 'Source of the magnitude',
  need: 'Need',
  geometry: 'Shape',
  effectiveRadius: 'Half-light radius',
  sersicIndex: 'Sérsic index',
  pmRa: 'Proper motion in right ascension',
  pmDec: 'Proper motion in declination',
  epoch: 'Epoch',
}
