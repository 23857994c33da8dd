/** A column as its file describes it; what a format does not say is an empty text. */
export interface TableColumn {
  name: string
  unit: string
  ucd: string
  description: string
  /** Coordinate system the file names for it, as 'ICRS'. */
  system: string
}

/** A table of text as a file holds it. */
export interface Table {
  columns: readonly TableColumn[]
  /** Cells of each row, which may be more or fewer than there are columns. */
  records: readonly (readonly string[])[]
  /** Whether its cells carry the apostrophe that keeps spreadsheets from running them. */
  isGuarded: boolean
}

export type TableReading = { ok: true; table: Table } | { ok: false; message: string }

/** The most rows that are read to be looked at; a proposal keeps fewer. */
export const mostRows = 5000
