import { csvText } from '@/lib/format'
import type { TypedRow } from './recordForm'
import type { TableKind } from './tableHeads'

const heads: Record<TableKind, readonly [string, string]> = {
  throughput: ['Wavelength (Å)', 'Efficiency'],
  extinction: ['Band', 'Extinction (mag an airmass)'],
  'dark-sky': ['Band', 'Dark sky (AB mag arcsec-2)'],
  horizon: ['Azimuth (deg)', 'Lowest altitude (deg)'],
}

/** A table of a record as a file that can be read back in; cells that a spreadsheet would run are guarded. */
export const recordTableCsv = (kind: TableKind, rows: readonly TypedRow[]): string =>
  csvText(
    heads[kind],
    rows.map(({ at, value }) => [at, value]),
  )
