import { exportColumns } from './exportColumns'
import { exportTable, type Exported } from './exportTable'
import { guardedCell } from './guardedCell'

/** The targets as CSV (RFC 4180): what was typed, and what it comes to under the cosmology named in the last column. */
export function targetsCsv(exported: Exported): string {
  const heads = exportColumns.map(({ name }) => name)
  return [heads, ...exportTable(exported)]
    .map((row) => `${row.map((text) => guardedCell(text, false)).join(',')}\r\n`)
    .join('')
}
