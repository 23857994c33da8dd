import { csvText } from '@/lib/format'
import { fields, rowCells } from './fields'
import type { Observability } from './findObservability'

/** An answer as CSV: the rows alone. */
export function answerCsv(found: Observability): string {
  return csvText(
    fields.map(({ name }) => name),
    found.rows.map((row) => rowCells(found, row)),
  )
}
