import { readTable } from './tables/readTable'
import { recogniseColumns } from './tables/recogniseColumns'
import { rowsOf, type ImportedRow } from './tables/rowsOf'
import type { Table } from './tables/types'
import type { Mapping, TargetColumn } from './targetColumn'

export type TargetFile =
  | {
      ok: true
      table: Table
      /** What each column was taken for. */
      mapping: Mapping
      rows: ImportedRow[]
      recognised: TargetColumn[]
      /** Names of the columns that are left out. */
      ignored: string[]
    }
  | { ok: false; message: string }

/**
 * Reads a file of targets: VOTable, ECSV, or cells between commas, semicolons, tabs or blanks, with columns in any
 * order, told by name, UCD and unit. Says what is wrong row by row and keeps everything as it is written.
 */
export function readTargetFile(text: string): TargetFile {
  const read = readTable(text)
  if (!read.ok) return read
  const { table } = read
  const mapping = recogniseColumns(table.columns)
  const recognised = mapping.flatMap((column) => column ?? [])
  if (recognised.length === 0)
    return {
      ok: false,
      message:
        'The first line must name the columns, one of them name, target or object; then ra, dec, z, mag.',
    }
  if (table.records.length === 0) return { ok: false, message: 'There are heads, but no rows under them.' }
  const ignored = table.columns.flatMap(({ name }, index) =>
    mapping[index] ? [] : name || `column ${index + 1}`,
  )
  return { ok: true, table, mapping, rows: rowsOf(table, mapping), recognised, ignored }
}
