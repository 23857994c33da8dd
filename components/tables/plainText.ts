import type { CellValue } from './tableColumn'

/** A cell's value as text for searching. */
export function plainText(value: CellValue): string {
  if (value === null || value === undefined) return ''
  return value instanceof Date ? value.toISOString() : String(value)
}
