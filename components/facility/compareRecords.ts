import type { FieldWords, TypedRow } from '@/lib/domain/facility/recordForm'
import { ABSENT, formatList } from '@/lib/format'

export interface FieldDifference {
  name: string
  label: string
  a: string
  b: string
}

const isRows = (value: unknown[]): value is TypedRow[] =>
  value.every((row) => typeof row === 'object' && row !== null && 'at' in row)

const mostRowsShown = 12

function tableWords(rows: TypedRow[]): string {
  const shown = rows.slice(0, mostRowsShown).map(({ at, value }) => `${at}: ${value}`)
  const more = rows.length - shown.length
  return shown.join(', ') + (more > 0 ? ` and ${more} more rows` : '')
}

function valueWords(value: unknown, unit: string | undefined): string {
  if (value === true) return 'yes'
  if (value === false) return 'no'
  if (Array.isArray(value)) {
    if (value.length === 0) return ABSENT
    return isRows(value) ? tableWords(value) : formatList(value.map(String))
  }
  const text = typeof value === 'string' ? value.trim() : ''
  if (text === '') return ABSENT
  if (!unit) return text
  return unit === '°' || unit.startsWith('″') ? `${text}${unit}` : `${text}\u00a0${unit}`
}

/** The fields in which two forms of a record differ, each side in words, in the order of the fields. */
export function compareRecords(
  fields: Readonly<Record<string, FieldWords>>,
  a: Readonly<Record<string, unknown>>,
  b: Readonly<Record<string, unknown>>,
): FieldDifference[] {
  return Object.entries(fields).flatMap(([name, { label, unit }]) => {
    if (JSON.stringify(a[name]) === JSON.stringify(b[name])) return []
    const [left, right] = [valueWords(a[name], unit), valueWords(b[name], unit)]
    const long = left.length > 0 && left === right ? ' (in later rows)' : ''
    return [{ name, label: label + long, a: left, b: right }]
  })
}
