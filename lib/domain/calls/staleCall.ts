import type { CallsRow } from '@/db/tables'
import { refuse } from '@/lib/errors'

/** Someone else in the office changed the call first; with what it holds now. */
export function staleCall(row: CallsRow) {
  return refuse.stale({
    changedBy: 'Someone else in the office',
    changedAt: new Date().toISOString(),
    version: row.version,
    theirs: {
      opensAt: row.opens_at.toISOString(),
      closesAt: row.closes_at.toISOString(),
      graceUntil: row.grace_until.toISOString(),
      assessmentsDueAt: row.assessments_due_at.toISOString(),
      reviewsDueAt: row.reviews_due_at.toISOString(),
      panelMeetsAt: row.panel_meets_at.toISOString(),
      lettersAt: row.letters_at.toISOString(),
    },
  })
}
