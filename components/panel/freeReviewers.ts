import type { AssignmentRow, AssignmentsView, PanelReviewer } from '@/lib/domain/assignments/assignmentsView'

/** Who may still be given a proposal, the lightest load first. */
export function freeReviewers(view: AssignmentsView, row: AssignmentRow): PanelReviewer[] {
  const taken = new Set([
    ...row.readers.map((reader) => reader.personId),
    ...row.interests.map((interest) => interest.personId),
  ])
  return view.reviewers
    .filter((reviewer) => reviewer.mayReview && !taken.has(reviewer.personId))
    .sort((a, b) => a.pages - b.pages || a.number - b.number)
}
