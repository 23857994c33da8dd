import { rowErrors, type RowErrors } from '../rowErrors'
import type { TargetRow } from '../schema'
import { splitPosition } from '../splitPosition'
import { cellOf, type Mapping, type TargetColumn } from '../targetColumn'
import { emptyTargetRow } from '../targetRow'
import { bandOf } from './bandOf'
import { bandInName } from './bandInName'
import { cellReader } from './cellReader'
import type { Table } from './types'

export interface ImportedRow {
  /** Line of the table, 1 for the first under the heads. */
  number: number
  row: TargetRow
  /** What is wrong with the file here, by cell: its units, or how many cells it has. */
  problems: RowErrors
  /** All that is wrong, by cell; empty when the row is right. */
  errors: RowErrors
}

type Cells = ReadonlyMap<TargetColumn, string>

function choice<T extends string>(text: string, options: readonly T[], otherwise: T): T {
  const word = text.toLowerCase()
  return options.find((option) => word !== '' && option.startsWith(word)) ?? otherwise
}

/** What columns say of all their rows at once. */
interface Said {
  /** The band the magnitudes are named after. */
  band: string | null
  redshiftType: TargetRow['redshiftType']
}

/** The shape of a spectrum: the one named, else the one that something is said of. */
function spectrumCells(text: (column: TargetColumn) => string) {
  const [spectralIndex, temperature] = [text('spectralIndex'), text('temperature')]
  const spectrumTable = text('spectrumTable')
  const stated =
    spectrumTable !== ''
      ? 'table'
      : spectralIndex !== ''
        ? 'power-law'
        : temperature !== ''
          ? 'black-body'
          : 'flat'
  return {
    spectrum: choice(text('spectrum'), ['flat', 'power-law', 'black-body', 'table'], stated),
    ...{ spectralIndex, spectralIndexError: text('spectralIndexError'), temperature, spectrumTable },
  }
}

function rowOf(cells: Cells, said: Said): TargetRow {
  const position = splitPosition(cells.get('position') ?? '')
  const text = (column: TargetColumn, otherwise = '') => cells.get(column) ?? otherwise
  const isLuminosity = text('lineLuminosity') !== ''
  return {
    name: text('name'),
    ra: text('ra', position?.ra ?? cells.get('position')),
    dec: text('dec', position?.dec),
    redshift: text('redshift'),
    redshiftType: choice(
      text('redshiftType'),
      ['spectroscopic', 'photometric', 'assumed'],
      said.redshiftType,
    ),
    redshiftError: text('redshiftError'),
    redshiftFrame: choice(text('redshiftFrame'), ['heliocentric', 'cmb'], 'heliocentric'),
    magnitude: text('magnitude'),
    magnitudeError: text('magnitudeError'),
    band: bandOf(cells.get('band') || said.band, cells.get('system') ?? ''),
    provenance: choice(text('provenance'), ['observed', 'predicted'], 'observed'),
    source: text('source'),
    group: text('group'),
    event: text('event'),
    trigger: text('trigger'),
    reaction: text('reaction'),
    triggers: text('triggers'),
    need: choice(text('need'), ['required', 'optional', 'backup'], 'required'),
    geometry:
      text('effectiveRadius') === '' ? 'point' : choice(text('geometry'), ['sersic', 'uniform'], 'sersic'),
    effectiveRadius: text('effectiveRadius'),
    effectiveRadiusError: text('effectiveRadiusError'),
    sersicIndex: text('sersicIndex'),
    ebv: text('ebv'),
    magnification: text('magnification'),
    magnificationError: text('magnificationError'),
    lineName: text('lineName'),
    lineKind: isLuminosity ? 'luminosity' : choice(text('lineKind'), ['flux', 'luminosity'], 'flux'),
    lineValue: text('lineLuminosity') || text('lineFlux') || text('lineValue'),
    lineError: (isLuminosity ? text('lineLuminosityError') : text('lineFluxError')) || text('lineError'),
    lineWidth: text('lineWidth'),
    ...spectrumCells(text),
    pmRa: text('pmRa'),
    pmDec: text('pmDec'),
    epoch: text('epoch') || emptyTargetRow.epoch,
  }
}

function saidOf(table: Table, mapping: Mapping): Said {
  const magnitudes = table.columns[mapping.indexOf('magnitude')]
  const redshifts = table.columns[mapping.indexOf('redshift')]
  return {
    band: magnitudes ? bandInName(magnitudes) : null,
    redshiftType: /phot/i.test(`${redshifts?.name} ${redshifts?.ucd}`) ? 'photometric' : 'spectroscopic',
  }
}

/** A cell that is missing moves every one behind it: such a row is not read past. */
function raggedness(record: readonly string[], width: number): RowErrors {
  const cells =
    record.slice(0, width).length + record.slice(width).filter((text) => text.trim() !== '').length
  return cells === width ? {} : { name: `This row has ${cells} cells under ${width} heads.` }
}

/** The rows of a table under a mapping of its columns: each cell in a target's unit, and what is wrong, cell by cell. */
export function rowsOf(table: Table, mapping: Mapping): ImportedRow[] {
  const readers = mapping.flatMap((column, index) => {
    const file = table.columns[index]
    return column && file ? [{ column, index, reader: cellReader(column, file) }] : []
  })
  const said = saidOf(table, mapping)
  return table.records.map((record, index) => {
    const cells = new Map<TargetColumn, string>()
    const problems: RowErrors = raggedness(record, table.columns.length)
    for (const { column, index: place, reader } of readers) {
      const raw = (record[place] ?? '').trim()
      const { text, problem } = reader.read(table.isGuarded ? raw.replace(/^'(?='*[=+\-@])/, '') : raw)
      cells.set(column, text)
      if (problem) problems[cellOf(column)] ??= problem
    }
    const row = rowOf(cells, said)
    if (row.lineValue !== '' && row.lineName === '') problems.lineName ??= 'Name the line this is of, as Hα.'
    return { number: index + 1, row, problems, errors: { ...rowErrors(row), ...problems } }
  })
}
