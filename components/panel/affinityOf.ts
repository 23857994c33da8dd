import type { AssignmentRow, AssignmentsView } from '@/lib/domain/assignments/assignmentsView'

/** How well a reviewer knows the subject of a row, 0 to 1; null for who has not said, or left the panel. */
export function affinityOf(view: AssignmentsView, row: AssignmentRow, personId: number): number | null {
  const place = view.reviewers.findIndex((reviewer) => reviewer.personId === personId)
  return row.affinities[place] ?? null
}

/** The mean over the readers of a row who have said what they know; null where none has. */
export function meanAffinity(view: AssignmentsView, row: AssignmentRow): number | null {
  const said = row.readers.flatMap(({ personId }) => affinityOf(view, row, personId) ?? [])
  return said.length === 0 ? null : said.reduce((sum, one) => sum + one, 0) / said.length
}
