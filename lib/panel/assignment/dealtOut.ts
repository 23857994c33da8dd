import type { AssignmentDesk } from './assignmentProgramme'
import type { Candidate } from './candidatePairs'
import { startFrom } from './startFrom'

/**
 * An assignment to start from where all readers are alike, as the columns of its programme: the proposal with the
 * fewest candidates first, then the longest, each to those with the fewest pages so far.
 */
export function dealtOut(desk: AssignmentDesk): Float64Array {
  const { demands, candidates, standingPages } = desk
  const chosen = new Set<Candidate>()
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
      const candidate = candidates[column]
      if (!candidate) continue
      chosen.add(candidate)
      loads.set(candidate.reviewer, load(column) + proposal.pages)
    }
  }
  return startFrom(desk, chosen)
}
