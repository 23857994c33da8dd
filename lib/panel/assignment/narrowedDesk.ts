import type { AssignmentDesk } from './assignmentProgramme'
import type { Candidate } from './candidatePairs'

/** Readers kept for each proposal beside those the relaxation chose; twice as many where it chose in parts. */
const BEST_KEPT = 4
const PART = 1e-6

/**
 * The desk with fewer candidates: those the linear relaxation gives a part in, and for each proposal its best readers.
 * Nearly all of the relaxation is whole already, and branch and bound over the rest of it ends in seconds where over
 * all pairs it would take minutes.
 * @param relaxed the relaxation's values, one a candidate in order
 * @param besides pairs that are kept, too
 */
export function narrowedDesk<Desk extends AssignmentDesk>(
  desk: Desk,
  relaxed: Float64Array,
  besides: ReadonlySet<Candidate> = new Set(),
): Desk {
  const columns = new Map<number, number[]>()
  for (const [column, { proposal }] of desk.candidates.entries()) {
    const own = columns.get(proposal)
    if (own) own.push(column)
    else columns.set(proposal, [column])
  }
  const kept = new Set<number>()
  for (const own of columns.values()) {
    const isInParts = own.some((column) => (relaxed[column] ?? 0) > PART && (relaxed[column] ?? 0) < 1 - PART)
    const best = [...own].sort((a, b) => affinityAt(desk, b) - affinityAt(desk, a) || a - b)
    for (const column of best.slice(0, isInParts ? 2 * BEST_KEPT : BEST_KEPT)) kept.add(column)
    for (const column of own) if ((relaxed[column] ?? 0) > PART) kept.add(column)
  }
  const candidates = desk.candidates.filter((one, column) => kept.has(column) || besides.has(one))
  return { ...desk, candidates }
}

const affinityAt = ({ candidates }: AssignmentDesk, column: number) => candidates[column]?.affinity ?? 0
