import { csvCell } from './csvCell'

export type CsvValue = string | number | boolean | null | undefined

/** Rows of a CSV file (RFC 4180 line ends), for files that are sent piece by piece. */
export function csvRows(rows: readonly (readonly CsvValue[])[]): string {
  return rows.map((row) => `${row.map(csvCell).join(',')}\r\n`).join('')
}

/** A whole CSV file from a head and rows. */
export function csvText(head: readonly string[], rows: readonly (readonly CsvValue[])[]): string {
  return csvRows([head, ...rows])
}
