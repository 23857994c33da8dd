import { csvCell } from './csvCell'

export type CsvValue = string | number | boolean | null | undefined

/** A whole CSV file (RFC 4180 line ends) from a head and rows. */
export function csvText(head: readonly string[], rows: readonly (readonly CsvValue[])[]): string {
  return [head, ...rows].map((row) => row.map(csvCell).join(',')).join('\r\n') + '\r\n'
}
