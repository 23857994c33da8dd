import { csvText } from '@/lib/format'
import type { Sheet } from '../sheets/sheet'

/** The sheet as CSV: one head with units, values in full. Text that a spreadsheet would run stays text. */
export function sheetCsv({ columns, rows }: Sheet): string {
  return csvText(
    columns.map(({ id, fileUnit }) => (fileUnit ? `${id} (${fileUnit})` : id)),
    rows.map(({ cells }) => cells.map(({ value }) => value)),
  )
}
