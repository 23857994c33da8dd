import type { AssignmentDesk } from './assignmentProgramme'
import type { Candidate } from './candidatePairs'

/** Pairs as the columns of a desk's programme, for the solver to start from. */
export function startFrom(
  { demands, candidates, reviewers, standingPages, leastPages, mostPages }: AssignmentDesk,
  chosen: ReadonlySet<Candidate>,
): Float64Array {
  const values = new Float64Array(candidates.length + 1 + 2 * reviewers.length)
  const loads = new Map(standingPages)
  const pagesOf = new Map(demands.map(({ proposal }) => [proposal.id, proposal.pages]))
  for (const [column, candidate] of candidates.entries()) {
    if (!chosen.has(candidate)) continue
    values[column] = 1
    const { proposal, reviewer } = candidate
    loads.set(reviewer, (loads.get(reviewer) ?? 0) + (pagesOf.get(proposal) ?? 0))
  }
  for (const [i, id] of reviewers.entries()) {
    const pages = loads.get(id) ?? 0
    values[candidates.length + 1 + 2 * i] = Math.max(0, leastPages - pages)
    values[candidates.length + 2 + 2 * i] = Math.max(0, pages - mostPages)
  }
  return values
}
