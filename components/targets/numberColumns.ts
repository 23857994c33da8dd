import { formatNumber, NO_BREAK_SPACE } from '@/lib/format'
import type { TargetComputation } from '@/lib/domain/observations/types'

export type NumberColumnId = 'luminosity' | 'scale' | 'lookback' | 'modulus' | 'angular' | 'comoving' | 'age'

export interface NumberColumn {
  id: NumberColumnId
  head: string
  unit: string
  /** What the number is, in a few words. */
  what: string
  decimals: number
  value: (computed: TargetComputation) => number | null
  /** The same under the comparison cosmology, where it is computed. */
  other?: (comparison: NonNullable<TargetComputation['comparison']>) => number
  source: string
  shownFirst: boolean
}

/** Columns that follow from a redshift and a cosmology, in the order of the table. */
export const numberColumns: readonly NumberColumn[] = [
  {
    id: 'luminosity',
    head: 'DL',
    unit: 'Mpc',
    what: 'luminosity distance',
    decimals: 1,
    value: ({ luminosityMpc }) => luminosityMpc,
    other: ({ luminosityMpc }) => luminosityMpc,
    source: 'Hogg 1999, eq. 21',
    shownFirst: true,
  },
  {
    id: 'scale',
    head: 'scale',
    unit: 'kpc/″',
    what: 'proper scale',
    decimals: 3,
    value: ({ kpcPerArcsec }) => kpcPerArcsec,
    other: ({ kpcPerArcsec }) => kpcPerArcsec,
    source: 'Hogg 1999, eq. 18',
    shownFirst: true,
  },
  {
    id: 'lookback',
    head: 'lookback',
    unit: 'Gyr',
    what: 'lookback time',
    decimals: 2,
    value: ({ lookbackGyr }) => lookbackGyr,
    other: ({ lookbackGyr }) => lookbackGyr,
    source: 'Hogg 1999, eq. 30',
    shownFirst: true,
  },
  {
    id: 'modulus',
    head: 'modulus',
    unit: 'mag',
    what: 'distance modulus',
    decimals: 2,
    value: ({ distanceModulusMag }) => distanceModulusMag,
    other: ({ luminosityMpc }) => 5 * Math.log10(luminosityMpc) + 25,
    source: 'Hogg 1999, eq. 25',
    shownFirst: true,
  },
  {
    id: 'angular',
    head: 'DA',
    unit: 'Mpc',
    what: 'angular-diameter distance',
    decimals: 1,
    value: ({ angularDiameterMpc }) => angularDiameterMpc,
    source: 'Hogg 1999, eq. 18',
    shownFirst: false,
  },
  {
    id: 'comoving',
    head: 'DC',
    unit: 'Mpc',
    what: 'comoving distance',
    decimals: 1,
    value: ({ comovingMpc }) => comovingMpc,
    source: 'Hogg 1999, eq. 15',
    shownFirst: false,
  },
  {
    id: 'age',
    head: 'age then',
    unit: 'Gyr',
    what: 'age of the universe at that redshift',
    decimals: 2,
    value: ({ ageGyr }) => ageGyr,
    source: 'Hogg 1999, eq. 30, from z to the beginning',
    shownFirst: false,
  },
]

/** A number of a column with its unit. */
export const withUnit = (column: NumberColumn, value: number): string =>
  `${formatNumber(value, column.decimals)}${NO_BREAK_SPACE}${column.unit}`
