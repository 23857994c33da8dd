import type { CellValue } from './tableColumn'

const rank = (value: CellValue): string | number =>
  value instanceof Date ? value.getTime() : typeof value === 'boolean' ? Number(value) : (value ?? '')

/** Numbers by size, text as people order it (`Field 2` before `Field 10`). */
export function compareValues(a: CellValue, b: CellValue): number {
  const [first, second] = [rank(a), rank(b)]
  if (typeof first === 'number' && typeof second === 'number') return first - second
  return String(first).localeCompare(String(second), 'en-GB', { numeric: true, sensitivity: 'base' })
}
