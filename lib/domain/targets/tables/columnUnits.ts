import type { TargetColumn } from '../targetColumn'

/** The unit a target keeps each number in; an empty text for a pure number. Columns of words are not here. */
export const columnUnits: ReadonlyMap<TargetColumn, string> = new Map<TargetColumn, string>([
  ['ra', 'deg'],
  ['dec', 'deg'],
  ['epoch', 'yr'],
  ['pmRa', 'mas/yr'],
  ['pmDec', 'mas/yr'],
  ['redshift', ''],
  ['redshiftError', ''],
  ['magnitude', 'mag'],
  ['magnitudeError', 'mag'],
  ['effectiveRadius', 'arcsec'],
  ['sersicIndex', ''],
  ['spectralIndex', ''],
  ['spectralIndexError', ''],
  ['temperature', 'K'],
  ['ebv', 'mag'],
  ['magnification', ''],
  ['magnificationError', ''],
  ['lineFlux', 'erg/s/cm2'],
  ['lineFluxError', 'erg/s/cm2'],
  ['lineLuminosity', 'erg/s'],
  ['lineLuminosityError', 'erg/s'],
  ['lineWidth', 'km/s'],
  ['reaction', 'h'],
  ['triggers', ''],
])
