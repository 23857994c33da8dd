import { csvText, type CsvValue } from '@/lib/format'
import type { CellValue, TableColumn } from './tableColumn'

const exported = (value: CellValue): CsvValue => (value instanceof Date ? value.toISOString() : value)

/** The file of what is shown: the heads with their units, then the plain values, in the order on screen. */
export function tableCsv<Row>(columns: readonly TableColumn<Row>[], rows: readonly Row[]): string {
  const head = columns.map(({ head: words, unit }) => (unit ? `${words} (${unit})` : words))
  return csvText(
    head,
    rows.map((row) => columns.map((column) => (column.csv ? column.csv(row) : exported(column.value(row))))),
  )
}
