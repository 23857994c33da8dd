import type { z } from 'zod'
import { formatList, formatNumber } from '@/lib/format'
import { readNumber } from '@/lib/science/redshift'
import { delimiterOf, readRecords } from '../targets/csv'
import { bandTable, darkSkyQuantity, extinctionQuantity } from './bandTableSchema'
import { typed, type TypedRow } from './recordForm'
import { horizonTable, mostHorizonRows } from './horizonSchema'
import { readTableHeads, type TableHeads, type TableKind } from './tableHeads'
import { mostThroughputRows, throughputTable } from './throughputSchema'

export interface TableProblem {
  /** Row of the table, 1 for the first under the heads. */
  row: number
  /** The column, in words. */
  column: string
  /** What stands there. */
  text: string
  message: string
}

export type TableRead =
  { ok: true; rows: TypedRow[]; problems: TableProblem[]; notes: string[] } | { ok: false; message: string }

const schemas: Record<TableKind, z.ZodType<unknown, TypedRow[]>> = {
  throughput: throughputTable,
  extinction: bandTable(extinctionQuantity),
  'dark-sky': bandTable(darkSkyQuantity),
  horizon: horizonTable,
}

const mostRows = (kind: TableKind) => (kind === 'horizon' ? mostHorizonRows : mostThroughputRows)

export const columnWords: Record<TableKind, { at: string; value: string }> = {
  throughput: { at: 'Wavelength', value: 'Efficiency' },
  extinction: { at: 'Band', value: 'Extinction' },
  'dark-sky': { at: 'Band', value: 'Dark sky' },
  horizon: { at: 'Azimuth', value: 'Lowest altitude' },
}

/** A spreadsheet's guard against formulas is taken off again. */
const cellText = (text: string | undefined) => (text ?? '').trim().replace(/^'(?=[=+\-@])/, '')

/** A number of a file, multiplied; text that is no number stays as it was, for its message. */
function scaled(text: string, factor: number, hasDecimalComma: boolean): string {
  const plain = hasDecimalComma ? text.replace(/^([+\-\u2212]?\d*),(\d+)/, '$1.$2') : text
  const value = readNumber(plain)
  return value === null ? plain : typed(Number((value * factor).toPrecision(12)))
}

function rowOf(record: readonly string[], heads: TableHeads, kind: TableKind, comma: boolean): TypedRow {
  const at = cellText(record[heads.at])
  const value = cellText(record[heads.value])
  if (kind === 'horizon') return { at: scaled(at, 1, comma), value: scaled(value, 1, comma) }
  if (kind !== 'throughput') return { at, value: scaled(value, 1, comma) }
  const share = /^(.*\d)\s*%$/.exec(value)?.[1]
  const perCent = heads.isPercent || share !== undefined
  return {
    at: scaled(at, heads.factor, comma),
    value: scaled(share ?? value, perCent ? 0.01 : 1, comma),
  }
}

function problemsOf(rows: TypedRow[], kind: TableKind): TableProblem[] | string {
  const result = schemas[kind].safeParse(rows)
  const problems: TableProblem[] = []
  for (const issue of result.error?.issues ?? []) {
    const [index, cell] = issue.path
    const row = typeof index === 'number' ? rows[index] : undefined
    if (!row || typeof index !== 'number' || (cell !== 'at' && cell !== 'value')) return issue.message
    problems.push({
      row: index + 1,
      column: columnWords[kind][cell],
      text: row[cell],
      message: issue.message,
    })
  }
  return problems
}

function notesOf(heads: TableHeads, rows: TypedRow[], kind: TableKind): string[] {
  const notes: string[] = []
  if (kind === 'throughput') {
    if (heads.unit === null) notes.push('No unit stands at the wavelengths: they are taken as Å.')
    else if (heads.factor !== 1) notes.push(`Wavelengths in ${heads.unit} were turned into Å.`)
    if (heads.isPercent) notes.push('Efficiencies in per cent were turned into shares of 1.')
    else if (rows.some(({ value }) => Number(value) > 1 && Number(value) <= 100))
      notes.push('If the efficiencies are in per cent, say so in their head: efficiency (%).')
  }
  if (heads.unknown.length > 0) notes.push(`Left out: ${formatList(heads.unknown)}.`)
  return notes
}

/** Whether a horizon ends with its first row once more. */
function saysNorthTwice(rows: readonly TypedRow[]): boolean {
  const [first, last] = [rows[0], rows.at(-1)]
  return first?.at === '0' && last?.at === '360' && first.value === last.value
}

/**
 * Reads a table out of a file or what was pasted: comma, semicolon or tab between cells, a decimal comma only beside
 * semicolons, columns by their heads, wavelengths in the unit the head names. Says what is wrong row by row.
 */
export function readTable(text: string, kind: TableKind): TableRead {
  const no = (message: string): TableRead => ({ ok: false, message })
  const clean = text.replace(/^\uFEFF/, '').replace(/\r\n?/g, '\n')
  if (clean.includes('\u0000')) return no('This is not a text file.')
  const lines = clean.split('\n').filter((line) => line.trim() !== '' && !line.trimStart().startsWith('#'))
  const [first, ...rest] = lines
  if (first === undefined) return no('There are no rows in it.')
  const delimiter = delimiterOf(first)
  if (delimiter === ' ') return no('Part the columns by commas, semicolons or tabs, and name them first.')
  if (rest.length === 0) return no('There are heads, but no rows under them.')
  const most = mostRows(kind)
  // A horizon may say north twice.
  if (rest.length > most + (kind === 'horizon' ? 1 : 0))
    return no(
      `There are ${formatNumber(rest.length)} rows; at most ${formatNumber(most)} are kept. ` +
        `One row in ${formatNumber(Math.ceil(rest.length / most))} would do.`,
    )
  const [headRow = [], ...records] = readRecords(lines.join('\n'), delimiter)
  const heads = readTableHeads(headRow, kind)
  if (typeof heads === 'string') return no(heads)
  const all = records.map((record) => rowOf(record, heads, kind, delimiter === ';'))
  const isNorthTwice = kind === 'horizon' && saysNorthTwice(all)
  const rows = isNorthTwice ? all.slice(0, -1) : all
  const problems = problemsOf(rows, kind)
  if (typeof problems === 'string') return no(problems)
  const notes = notesOf(heads, rows, kind)
  if (isNorthTwice) notes.push('The last row, at 360°, says what the first one says at 0°: it was left out.')
  return { ok: true, rows, problems, notes }
}
