import type { Solve } from '../solver/types'
import { assignmentDesk } from './assignmentDesk'
import { linkGroups } from './linkGroups'
import type { OptimalAssignments, OptimalInput } from './optimalTypes'
import { seatsFor } from './seatsFor'
import { solveAssignments } from './solveAssignments'
import { whyNotValid } from './whyNotValid'

/**
 * Each proposal with its readers: no barred pair, standing pairs kept, loads within the mean +- tolerance as far as that
 * can be, then the worst-served proposal's affinity as high as can be, then the sum of all affinities (after Stelmakh,
 * Shah & Singh 2021, J. Mach. Learn. Res. 22, 163), and all reviewers linked by shared proposals. What cannot be met is
 * told, not refused. Gives a sentence when the solver has no answer. Same input, same answer, unless time runs out.
 */
export async function optimalAssignments(
  input: OptimalInput,
  solve: Solve,
): Promise<OptimalAssignments | { why: string }> {
  const desk = assignmentDesk(input)
  const settled = await solveAssignments(desk, input, solve)
  if ('why' in settled) return settled
  const { solution, whyNotLinked } = await linkGroups(desk, input, solve, settled)
  const { outcome } = solution
  const wrong = whyNotValid(input, outcome.pairs)
  if (wrong) return { why: `The solver's answer does not hold: ${wrong}` }

  const readers = new Map(desk.demands.map(({ proposal, standing }) => [proposal.id, [...standing]]))
  for (const { proposal, reviewer } of outcome.pairs) readers.get(proposal)?.push(reviewer)
  const standing = input.standing.filter(({ proposal }) => readers.has(proposal))
  const held = new Set(standing.map(({ proposal, reviewer }) => `${proposal}:${reviewer}`))
  const worst = outcome.worst ?? 0
  return {
    pairs: seatsFor(readers, standing).filter((pair) => !held.has(`${pair.proposal}:${pair.reviewer}`)),
    short: desk.demands
      .filter(({ lacking }) => lacking > 0)
      .map(({ proposal, lacking }) => ({ proposal: proposal.id, lacking }))
      .sort((a, b) => a.proposal - b.proposal),
    meanPages: desk.meanPages,
    tolerancePages: desk.tolerancePages,
    outside: outcome.outside,
    worst: {
      value: worst,
      bound: outcome.worst === null ? 0 : Math.max(worst, Math.min(solution.worstBound, desk.bestWorst)),
    },
    sum: { value: outcome.sum, bound: Math.max(outcome.sum, Math.min(solution.sumBound, desk.bestSum)) },
    groups: outcome.groups.length,
    whyNotLinked,
  }
}
