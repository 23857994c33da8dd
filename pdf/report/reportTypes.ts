import type { FactRow } from '../parts/FactRows'

export interface ReportColumn {
  head: string
  unit?: string
  /** Points; the columns of a table fill 511 of them. */
  width: number
  align?: 'right'
  bold?: boolean
}

/** One section: any of a sentence, definition rows, a table, and paragraphs, in this order. */
export interface ReportSection {
  heading: string
  note?: string
  facts?: readonly FactRow[]
  table?: { columns: readonly ReportColumn[]; rows: readonly (readonly string[])[] }
  lines?: readonly string[]
}

/** Everything the report prints, in words. */
export interface ReportData {
  observatory: string
  season: string
  /** Small line above the title. */
  label: string
  title: string
  sentence: string
  sections: readonly ReportSection[]
  footer: { left: string; right: string }
}
