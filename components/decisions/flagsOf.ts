import type { DecisionRow } from '@/lib/domain/decisions/decisionsView'

/** How many places of what the investigators would read deserve a second look. */
export function flagsOf(row: DecisionRow): number {
  return row.comments.reduce(
    (sum, comment) => sum + (comment.withheldReason === null ? comment.flags.length : 0),
    row.flags.length,
  )
}
