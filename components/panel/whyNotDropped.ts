import type { AssignmentRow, AssignmentsView } from '@/lib/domain/assignments/assignmentsView'

/** Why a reviewer cannot be dropped on a proposal, in a sentence; null when they can. */
export function whyNotDropped(view: AssignmentsView, row: AssignmentRow, personId: number): string | null {
  const reviewer = view.reviewers.find((one) => one.personId === personId)
  if (!reviewer) return 'No longer sits on the panel.'
  const { name } = reviewer
  const interest = row.interests.find((one) => one.personId === personId)
  if (interest) return `${name} ${interest.words}.`
  if (row.readers.some((reader) => reader.personId === personId)) return `${name} reads it already.`
  return reviewer.mayReview ? null : `${name} does not hold the reviewer’s role on this panel.`
}
