import type { CosmologyQuantity } from '@/lib/science/cosmology'

/** One column of what the page shows and its files hold. */
export interface SheetColumn {
  /** Names the column in files and in the address: `luminosityMpc_2`. */
  id: string
  /** The head: a letter with what stands below it, or a word. */
  head: string
  below?: string
  /** Under the head, on the page. */
  unit?: string
  /** In files, as Astropy and the Virtual Observatory read it; empty for pure numbers and words. */
  fileUnit: string
  /** What it is, in words, with the cosmology it is under. */
  description: string
  /** The head in LaTeX, within mathematics; null for words. */
  latex: string | null
  /** Decimals alike in the column; null shows significant figures. */
  decimals: number | null
  /** The cosmology it belongs to, by its place; null for what belongs to none. */
  place: number | null
  /** Set where a number opens to its formula. */
  quantity?: CosmologyQuantity
  /** Digits as they were given, whatever the values. */
  given?: boolean
  /** Words stand left, numbers right. */
  words?: boolean
}

export interface SheetCell {
  value: number | string | null
  /** Why there is no value: a few words for the cell, and the sentence behind them. */
  absent?: { words: string; sentence: string }
  /** What the cell shows where that is shorter than its value. */
  shown?: string
  /** A note the reader should not miss: the row wants attention. */
  caution?: string
}

export interface SheetRow {
  /** Place in the list as typed; a redshift may be typed twice. */
  id: number
  cells: SheetCell[]
}

/** What the page shows as a table, and every file holds: one structure for both. */
export interface Sheet {
  title: string
  columns: SheetColumn[]
  rows: SheetRow[]
}

/** Fewest decimals that give the smallest value of a column three figures, within reason. */
export function decimalsFor(values: readonly (number | null)[], fewest: number, most = 6): number {
  let smallest = Infinity
  for (const value of values) {
    const size = value === null ? 0 : Math.abs(value)
    if (size > 0 && size < smallest) smallest = size
  }
  if (!Number.isFinite(smallest)) return fewest
  return Math.min(most, Math.max(fewest, 2 - Math.floor(Math.log10(smallest))))
}

/** Gives every number column the decimals its values need. */
export function withDecimals(sheet: Sheet): Sheet {
  const columns = sheet.columns.map((column, at) => {
    if (column.given || column.words || column.decimals === null) return column
    const values = sheet.rows.map(({ cells }) => {
      const value = cells[at]?.value
      return typeof value === 'number' ? value : null
    })
    return { ...column, decimals: decimalsFor(values, column.decimals) }
  })
  return { ...sheet, columns }
}
