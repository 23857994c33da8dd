import { affinityOf } from './affinityOf'
import type { AssignmentRow, AssignmentsView, PanelReviewer } from '@/lib/domain/assignments/assignmentsView'

/** Who may still be given a proposal: nearest to its subject first, among equals the lightest load. */
export function freeReviewers(view: AssignmentsView, row: AssignmentRow): PanelReviewer[] {
  const taken = new Set([
    ...row.readers.map((reader) => reader.personId),
    ...row.interests.map((interest) => interest.personId),
  ])
  return view.reviewers
    .filter((reviewer) => reviewer.mayReview && !taken.has(reviewer.personId))
    .map((reviewer) => ({ reviewer, affinity: affinityOf(view, row, reviewer.personId) ?? 0 }))
    .sort(
      (a, b) =>
        b.affinity - a.affinity ||
        a.reviewer.pages - b.reviewer.pages ||
        a.reviewer.number - b.reviewer.number,
    )
    .map(({ reviewer }) => reviewer)
}
