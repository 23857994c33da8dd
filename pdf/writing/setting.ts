import type { FormulaShapes } from './formulaShape'

/** What setting a text needs beside the text. */
export interface Setting {
  shapes: FormulaShapes
  /** Numbers of references by key. */
  citations: ReadonlyMap<string, number>
  /** Numbers of figures by label. */
  figures: ReadonlyMap<string, number>
}
