import type { ReactNode } from 'react'
import type { CsvValue } from '@/lib/format'

/** What a cell is sorted, searched and exported by. */
export type CellValue = string | number | boolean | Date | null | undefined

/** One column of a `DataTable`. Keep the list at module scope, so that it never changes between renders. */
export interface TableColumn<Row> {
  id: string
  /** The head's words; they are the sort button, too. */
  head: string
  /** How the head looks where plain words are not enough: a letter with an index. */
  shownHead?: ReactNode
  /** The second line of the head: a unit, or what the column holds. */
  unit?: string
  /** The plain value behind the cell. */
  value: (row: Row) => CellValue
  /** How it looks; without it the value is shown as text. */
  cell?: (row: Row) => ReactNode
  /** How many columns the cell takes; 0 where the cell before it covers this one. */
  span?: (row: Row) => number
  /** Least width, as CSS, for columns that must not move while a long table is scrolled. */
  width?: string
  /** On phones under its head and over the whole width: bars, and words that run long. */
  wide?: boolean
  /** Numbers stand right, with decimals alike in a column. */
  align?: 'left' | 'right'
  /** False where an order would mean nothing. */
  sortable?: boolean
  /** Tinted: computed, not typed. */
  computed?: boolean
  /** The cell of the closing row, for the rows shown. */
  total?: (rows: readonly Row[]) => ReactNode
  /** What the file holds; without it the value. */
  csv?: (row: Row) => CsvValue
}

export interface TableChip<Row> {
  id: string
  label: string
  matches: (row: Row) => boolean
}
