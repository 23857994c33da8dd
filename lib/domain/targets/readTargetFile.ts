import { bandChoice, magnitudeBands } from './bands'
import { delimiterOf, readRecords } from './csv'
import { readHeads, type KnownHeads, type TargetColumn } from './headers'
import { mostTargets } from './targetRules'
import { targetRowSchema, type TargetRow } from './schema'
import { splitPosition } from './splitPosition'
import { emptyTargetRow } from './targetRow'

export interface ImportedRow {
  /** Line of the table, 1 for the first under the heads. */
  number: number
  row: TargetRow
  /** Message by cell; empty when the row is right. */
  errors: Partial<Record<keyof TargetRow, string>>
}

export type TargetFile =
  | { ok: true; rows: ImportedRow[]; recognised: TargetColumn[]; ignored: string[] }
  | { ok: false; message: string }

/** Messages of a row, by cell. */
export function rowErrors(row: TargetRow): ImportedRow['errors'] {
  const result = targetRowSchema.safeParse(row)
  const errors: ImportedRow['errors'] = {}
  for (const issue of result.error?.issues ?? []) {
    const cell = issue.path[0] as keyof TargetRow | undefined
    if (cell) errors[cell] ??= issue.message
  }
  return errors
}

/** A spreadsheet's guard against formulas is taken off again. */
const cellText = (text: string | undefined) => (text ?? '').trim().replace(/^'(?=[=+\-@])/, '')

function choice<T extends string>(text: string, options: readonly T[], otherwise: T): T {
  const word = text.toLowerCase()
  return options.find((option) => word !== '' && option.startsWith(word)) ?? otherwise
}

function bandOf(cells: Map<TargetColumn, string>, named: string | null): string {
  const band = cells.get('band') || named
  if (!band) return emptyTargetRow.band
  const wanted = (cells.get('system') ?? '').toLowerCase()
  const whole = magnitudeBands.find((one) => bandChoice(one.band, one.system) === band)
  const found =
    magnitudeBands.find((one) => one.band === band && (!wanted || one.system.toLowerCase() === wanted)) ??
    whole
  return found ? bandChoice(found.band, found.system) : band
}

function rowOf(record: readonly string[], heads: KnownHeads): TargetRow {
  const cells = new Map<TargetColumn, string>()
  for (const [index, column] of heads.columns) cells.set(column, cellText(record[index]))
  const position = splitPosition(cells.get('position') ?? '')
  const text = (column: TargetColumn, otherwise = '') => cells.get(column) ?? otherwise
  return {
    ...emptyTargetRow,
    name: text('name'),
    ra: text('ra', position?.ra ?? cells.get('position')),
    dec: text('dec', position?.dec),
    redshift: text('redshift'),
    redshiftType: choice(text('redshiftType'), ['spectroscopic', 'photometric', 'assumed'], 'spectroscopic'),
    redshiftError: text('redshiftError'),
    redshiftFrame: choice(text('redshiftFrame'), ['heliocentric', 'cmb'], 'heliocentric'),
    magnitude: text('magnitude'),
    magnitudeError: text('magnitudeError'),
    band: bandOf(cells, heads.band),
    provenance: choice(text('provenance'), ['observed', 'predicted'], 'observed'),
    source: text('source'),
    need: choice(text('need'), ['required', 'optional', 'backup'], 'required'),
    geometry:
      text('effectiveRadius') === '' ? 'point' : choice(text('geometry'), ['sersic', 'uniform'], 'sersic'),
    effectiveRadius: text('effectiveRadius'),
    sersicIndex: text('sersicIndex'),
    ebv: text('ebv'),
    magnification: text('magnification'),
    magnificationError: text('magnificationError'),
    lineName: text('lineName'),
    lineKind: choice(text('lineKind'), ['flux', 'luminosity'], 'flux'),
    lineValue: text('lineValue'),
    lineError: text('lineError'),
    lineWidth: text('lineWidth'),
    pmRa: text('pmRa'),
    pmDec: text('pmDec'),
    epoch: text('epoch') || emptyTargetRow.epoch,
  }
}

/** Blank-delimited tables (ECSV's default) have runs of blanks between cells. */
const squeezed = (lines: string[], delimiter: string) =>
  delimiter === ' ' ? lines.map((line) => line.trim().replace(/ {2,}/g, ' ')) : lines

/**
 * Reads a table of targets: comma, semicolon, tab or (ECSV) blank between cells, any order of columns, heads by many
 * names, comment lines, byte-order mark. Says what is wrong row by row and keeps everything as typed.
 */
export function readTargetFile(text: string): TargetFile {
  const clean = text.replace(/^\uFEFF/, '').replace(/\r\n?/g, '\n')
  if (clean.includes('\u0000')) return { ok: false, message: 'This is not a text file.' }
  const declared = /^# delimiter: '?(.)'?\s*$/m.exec(clean)?.[1]
  const lines = clean.split('\n').filter((line) => line.trim() !== '' && !line.trimStart().startsWith('#'))
  const first = lines[0]
  if (first === undefined) return { ok: false, message: 'There are no rows in it.' }
  const delimiter = declared ?? delimiterOf(first)
  const [heads = [], ...records] = readRecords(squeezed(lines, delimiter).join('\n'), delimiter)
  const known = readHeads(heads)
  const recognised = [...known.columns.values()]
  if (!recognised.includes('name'))
    return {
      ok: false,
      message:
        'The first line must name the columns, one of them name, target or object; then ra, dec, z, mag.',
    }
  if (records.length === 0) return { ok: false, message: 'There are heads, but no rows under them.' }
  if (records.length > mostTargets)
    return { ok: false, message: `There are ${records.length} rows; at most ${mostTargets} can be kept.` }
  const rows = records.map((record, index) => {
    const row = rowOf(record, known)
    return { number: index + 1, row, errors: rowErrors(row) }
  })
  return { ok: true, rows, recognised, ignored: known.unknown }
}
