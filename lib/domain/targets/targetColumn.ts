import type { TargetRow } from './schema'

/** What a column of a file may be: a cell of a row, or what goes into one together with others. */
export type TargetColumn =
  | keyof TargetRow
  | 'position'
  | 'system'
  | 'lineFlux'
  | 'lineFluxError'
  | 'lineLuminosity'
  | 'lineLuminosityError'

/** What each column of a file was taken for, null for one that is left out. */
export type Mapping = readonly (TargetColumn | null)[]

const cells = new Map<TargetColumn, keyof TargetRow>([
  ['position', 'ra'],
  ['system', 'band'],
  ['lineFlux', 'lineValue'],
  ['lineFluxError', 'lineError'],
  ['lineLuminosity', 'lineValue'],
  ['lineLuminosityError', 'lineError'],
])

/** The cell of a row that a column of a file ends in. */
export const cellOf = (column: TargetColumn): keyof TargetRow =>
  cells.get(column) ?? (column as keyof TargetRow)
