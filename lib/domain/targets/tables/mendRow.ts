import { rowErrors } from '../rowErrors'
import type { TargetRow } from '../schema'
import type { ImportedRow } from './rowsOf'

/** A row with cells typed anew: what was wrong with the file is past where one has typed. */
export function mendRow(imported: ImportedRow, typed: Partial<TargetRow>): ImportedRow {
  const row = { ...imported.row, ...typed }
  const problems = { ...imported.problems }
  for (const cell of Object.keys(typed) as (keyof TargetRow)[]) delete problems[cell]
  return { ...imported, row, problems, errors: { ...rowErrors(row), ...problems } }
}
