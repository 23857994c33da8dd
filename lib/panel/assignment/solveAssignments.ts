import type { Solve } from '../solver/types'
import type { OpenedDesk } from './assignmentDesk'
import { assignmentProgramme } from './assignmentProgramme'
import { dealtOut } from './dealtOut'
import { describeOutcome, type Outcome } from './describeOutcome'
import { outsideCost } from './outsideCost'
import { solveLarge } from './solveLarge'
import type { OptimalInput } from './optimalTypes'

export interface AssignmentSolution {
  outcome: Outcome
  /** The affinity that was demanded for each proposal. */
  floor: number
  worstBound: number
  sumBound: number
}

/** Shares of the bound on the worst affinity that are tried one after the other. */
const FLOORS = [1, 0.99, 0.95, 0.8, 0]
const LARGE_FLOORS = [0.99, 0.9, 0]
/** Keeps a floor from being missed by rounding alone. */
const ROUNDING = 1e-7

/** The sum of affinities, each proposal served at least as well as `floor`, loads outside by at most `mostOutside` pages. */
export async function solveSum(
  desk: OpenedDesk,
  { affinity }: OptimalInput,
  solve: Solve,
  question: { floor: number; mostOutside: number; cuts: readonly ReadonlySet<number>[]; seconds: number },
): Promise<{ outcome: Outcome; sumBound: number } | { why: string }> {
  if (!desk.isSmall && !desk.areAlike) return solveLarge(desk, affinity, solve, question)
  const programme = assignmentProgramme(desk, { ask: 'sum', ...question })
  // Where only loads matter, branch and bound finds them late and dealing out finds them at once.
  if (desk.areAlike && question.cuts.length === 0) programme.start = dealtOut(desk)
  const answer = await solve(programme, {
    seconds: question.seconds,
    relativeGap: desk.relativeGap,
  })
  if (!answer.values) return { why: answer.why }
  const { values } = answer
  const chosen = desk.candidates.filter((_, column) => (values[column] ?? 0) > 0.5)
  const outcome = describeOutcome(chosen, desk.demands, desk.reviewers, desk, affinity)
  const standing = [...desk.standingAffinity.values()].reduce((sum, one) => sum + one, 0)
  return { outcome, sumBound: answer.bound + outsideCost(desk) * outcome.outsidePages + standing }
}

/**
 * The worst-served proposal first, then the sum. On a small panel the first is settled in whole readers; on a large one
 * the linear relaxation bounds it, and the sum is solved with that bound demanded of each proposal, or a little less:
 * nearly all of it where reviewers differ, as whole readers are then found from the relaxation.
 */
export async function solveAssignments(
  desk: OpenedDesk,
  input: OptimalInput,
  solve: Solve,
): Promise<AssignmentSolution | { why: string }> {
  if (desk.candidates.length === 0) {
    const outcome = describeOutcome([], desk.demands, desk.reviewers, desk, input.affinity)
    return { outcome, floor: 0, worstBound: outcome.worst ?? 0, sumBound: outcome.sum }
  }
  // Counted in what the solver was given, not by a clock: some for the bound, the rest for the floors in turn.
  const first = await solve(assignmentProgramme(desk, { ask: 'worst', isWhole: desk.isSmall }), {
    seconds: input.seconds * 0.4,
    relativeGap: 0,
  })
  if (!first.values && first.status !== 'unfinished') return { why: first.why }
  const worst = first.values?.[desk.candidates.length] ?? desk.bestWorst
  const outsidePages = (first.values ?? new Float64Array())
    .subarray(desk.candidates.length + 1, desk.candidates.length + 1 + 2 * desk.reviewers.length)
    .reduce((sum, pages) => sum + pages, 0)
  const bound = first.values ? first.bound : Infinity
  const isExact = desk.isSmall && first.status === 'optimal'
  const mostOutside = isExact ? Math.round(outsidePages) : Infinity
  let best: AssignmentSolution | null = null
  let why = 'The solver found no assignment.'
  let seconds = input.seconds * 0.6
  for (const share of desk.isSmall || desk.areAlike ? FLOORS : LARGE_FLOORS) {
    const floor = Math.max(0, share * worst - ROUNDING)
    const given = share === 0 ? seconds : seconds * 0.6
    seconds -= given
    const found = await solveSum(desk, input, solve, { floor, mostOutside, cuts: [], seconds: given })
    if ('why' in found) {
      why = found.why
      continue
    }
    if (best && best.outcome.outsidePages <= found.outcome.outsidePages) continue
    const worstBound = bound + outsideCost(desk) * found.outcome.outsidePages
    best = { outcome: found.outcome, floor, worstBound, sumBound: found.sumBound }
    if (isExact || found.outcome.outsidePages <= Math.ceil(outsidePages - ROUNDING)) break
  }
  return best ?? { why }
}
