import type { Mapping, TargetColumn } from '../targetColumn'
import { bandInName } from './bandInName'
import { columnUnits } from './columnUnits'
import { nameColumn } from './nameColumn'
import { readUnit } from './readUnit'
import { sameDimensions } from './sameDimensions'
import type { TableColumn } from './types'
import { ucdColumn } from './ucdColumn'

/** Whether a unit is one a column can have; what has no unit or an unknown one says nothing against it. */
function mayBe(column: TargetColumn, unit: string): boolean {
  const own = columnUnits.get(column)
  const given = unit === '' ? null : readUnit(unit)
  const wanted = own === undefined ? null : readUnit(own)
  return !given || !wanted || sameDimensions(given, wanted) || (column === 'ra' && unit === 'h')
}

const isUnit = (unit: string, of: TargetColumn) => unit !== '' && readUnit(unit) !== null && mayBe(of, unit)

/** What can be both flux and luminosity is told apart by its unit. */
function byLineUnit(column: TargetColumn | null, unit: string): TargetColumn | null {
  if (column !== 'lineValue' && column !== 'lineError') return column
  const isError = column === 'lineError'
  if (isUnit(unit, 'lineFlux')) return isError ? 'lineFluxError' : 'lineFlux'
  if (isUnit(unit, 'lineLuminosity')) return isError ? 'lineLuminosityError' : 'lineLuminosity'
  return column
}

function byUnit({ unit }: TableColumn): TargetColumn | null {
  if (/^["']?h:m:s|^hourangle$/i.test(unit)) return 'ra'
  return /^["']?d:m:s/i.test(unit) ? 'dec' : null
}

/** Magnitudes are often named after their band; a UCD or a unit of something else speaks against it. */
const byBand = (column: TableColumn): TargetColumn | null =>
  bandInName({ ...column, ucd: '' }) && mayBe('magnitude', column.unit) && /^(phot|$)/i.test(column.ucd)
    ? 'magnitude'
    : null

/** One letter says less than a UCD does, and a name whose unit cannot be gives way to whatever else can be told. */
function byName(column: TableColumn): TargetColumn | null {
  const known = byLineUnit(nameColumn(column.name), column.unit)
  const hasUcd = ucdColumn(column.ucd) !== null
  if (!known) return byBand(column)
  if (hasUcd && (column.name.trim().length === 1 || !mayBe(known, column.unit))) return null
  return mayBe(known, column.unit) ? known : (byBand(column) ?? known)
}

/** What each column of a table is: by its name, then by its UCD, then by its unit; the first to be something is it. */
export function recogniseColumns(columns: readonly TableColumn[]): Mapping {
  const mapping: (TargetColumn | null)[] = columns.map(() => null)
  for (const tell of [byName, ({ ucd }: TableColumn) => ucdColumn(ucd), byUnit]) {
    columns.forEach((column, index) => {
      if (mapping[index] !== null) return
      const found = tell(column)
      if (found && !mapping.includes(found)) mapping[index] = found
    })
  }
  return mapping
}
