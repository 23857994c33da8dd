import type { AssignmentDesk } from './assignmentProgramme'

/**
 * An assignment to start from where all readers are alike, as the columns of its programme: the proposal with the
 * fewest candidates first, then the longest, each to those with the fewest pages so far.
 */
export function dealtOut({
  demands,
  candidates,
  reviewers,
  standingPages,
  ...range
}: AssignmentDesk): Float64Array {
  const values = new Float64Array(candidates.length + 1 + 2 * reviewers.length)
  const columns = new Map<number, number[]>()
  for (const [column, { proposal }] of candidates.entries()) {
    const own = columns.get(proposal)
    if (own) own.push(column)
    else columns.set(proposal, [column])
  }
  const loads = new Map(standingPages)
  const load = (column: number) => loads.get(candidates[column]?.reviewer ?? -1) ?? 0
  const choice = (id: number, wanted: number) => (columns.get(id)?.length ?? 0) - wanted
  const order = [...demands].sort(
    (a, b) =>
      choice(a.proposal.id, a.wanted) - choice(b.proposal.id, b.wanted) ||
      b.proposal.pages - a.proposal.pages ||
      a.proposal.id - b.proposal.id,
  )
  for (const { proposal, wanted } of order) {
    const own = [...(columns.get(proposal.id) ?? [])].sort((a, b) => load(a) - load(b) || a - b)
    for (const column of own.slice(0, wanted)) {
      values[column] = 1
      loads.set(candidates[column]?.reviewer ?? -1, load(column) + proposal.pages)
    }
  }
  for (const [i, id] of reviewers.entries()) {
    const pages = loads.get(id) ?? 0
    values[candidates.length + 1 + 2 * i] = Math.max(0, range.leastPages - pages)
    values[candidates.length + 2 + 2 * i] = Math.max(0, pages - range.mostPages)
  }
  return values
}
