import type { Solve } from '../solver/types'
import type { OpenedDesk } from './assignmentDesk'
import type { OptimalInput } from './optimalTypes'
import { solveSum, type AssignmentSolution } from './solveAssignments'

/** Each cut is one more solution; a panel that needs more than this is not one panel. */
const MOST_CUTS = 8

/**
 * Solves again, each time with one more group made to share a proposal with the others, until all reviewers are linked:
 * first without giving up loads or the worst-served proposal, then at any price.
 */
export async function linkGroups(
  desk: OpenedDesk,
  input: OptimalInput,
  solve: Solve,
  start: AssignmentSolution,
): Promise<{ solution: AssignmentSolution; whyNotLinked: string | null }> {
  let solution = start
  const cuts: ReadonlySet<number>[] = []
  const seconds = input.seconds / MOST_CUTS
  while (solution.outcome.groups.length > 1) {
    const smallest = [...solution.outcome.groups].sort((a, b) => a.length - b.length)[0] ?? []
    if (!canShare(desk, new Set(smallest)))
      return {
        solution,
        whyNotLinked:
          'The interests and the number of readers leave no proposal that both groups could share.',
      }
    if (cuts.length === MOST_CUTS)
      return { solution, whyNotLinked: `They could not be linked in ${MOST_CUTS} attempts.` }
    cuts.push(new Set(smallest))
    const { floor, outcome } = start
    const kept = { floor, mostOutside: outcome.outsidePages, cuts, seconds }
    let found = await solveSum(desk, input, solve, kept)
    if ('why' in found)
      found = await solveSum(desk, input, solve, { ...kept, floor: 0, mostOutside: Infinity })
    if ('why' in found) return { solution, whyNotLinked: `They could not be linked: ${found.why}` }
    solution = { ...start, ...found, worstBound: start.worstBound }
  }
  return { solution, whyNotLinked: null }
}

/** Whether some proposal of two readers or more may have one on each side. */
function canShare({ demands, candidates }: OpenedDesk, group: ReadonlySet<number>): boolean {
  return demands.some(({ proposal, standing, wanted }) => {
    if (standing.length + wanted < 2) return false
    const own = candidates.filter((pair) => pair.proposal === proposal.id).map((pair) => pair.reviewer)
    const able = [...standing, ...own]
    return able.some((id) => group.has(id)) && able.some((id) => !group.has(id))
  })
}
