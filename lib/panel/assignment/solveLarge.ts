import type { Solve } from '../solver/types'
import type { OpenedDesk } from './assignmentDesk'
import { assignmentProgramme } from './assignmentProgramme'
import type { Candidate } from './candidatePairs'
import { describeOutcome, type Outcome } from './describeOutcome'
import { improveBySwaps } from './improveBySwaps'
import { narrowedDesk } from './narrowedDesk'
import type { OptimalInput } from './optimalTypes'
import { outsideCost } from './outsideCost'
import { startFrom } from './startFrom'

interface Question {
  floor: number
  mostOutside: number
  cuts: readonly ReadonlySet<number>[]
  seconds: number
}

/** Costs of what is lacking to the floor and of a page outside that are tried, in pages' own cost: each finds its own way. */
const PRICES = [
  { floorCost: 12, pageCost: 0.1 },
  { floorCost: 12, pageCost: 0.025 },
  { floorCost: 5, pageCost: 0.1 },
]
const ROUNDING = 1e-7

/**
 * The sum of affinities on a large panel. Its linear relaxation says what cannot be exceeded and is whole but for some
 * pairs; it is made whole and improved by exchanges, along several ways, of which the best is kept. From there branch
 * and bound goes on among the pairs that matter, for as long as there is time. Where groups must be linked (`cuts`),
 * exchanges would cut the link: then branch and bound goes alone.
 */
export async function solveLarge(
  desk: OpenedDesk,
  affinity: OptimalInput['affinity'],
  solve: Solve,
  question: Question,
): Promise<{ outcome: Outcome; sumBound: number } | { why: string }> {
  const relaxation = assignmentProgramme(desk, { ask: 'sum', ...question })
  relaxation.isInteger.fill(0)
  const relaxed = await solve(relaxation, { seconds: question.seconds / 2, relativeGap: 0 })
  if (!relaxed.values) return { why: relaxed.why }
  const describe = (chosen: Candidate[]) =>
    describeOutcome(chosen, desk.demands, desk.reviewers, desk, affinity)
  const known = question.cuts.length > 0 ? null : exchanged(desk, relaxed.values, question.floor, describe)
  const narrow = narrowedDesk(desk, relaxed.values, known?.pairs)
  const programme = assignmentProgramme(narrow, {
    ask: 'sum',
    ...question,
    ...(known && {
      floor: (known.outcome.worst ?? 0) - ROUNDING,
      mostOutside: Math.min(question.mostOutside, known.outcome.outsidePages),
    }),
  })
  if (known) programme.start = startFrom(narrow, known.pairs)
  const whole = await solve(programme, {
    seconds: question.seconds / 2,
    relativeGap: desk.relativeGap,
  })
  const found = whole.values
    ? describe(narrow.candidates.filter((_, column) => (whole.values[column] ?? 0) > 0.5))
    : null
  const outcome = found && (!known || isBetter(found, known.outcome)) ? found : known?.outcome
  if (!outcome) return { why: whole.values ? 'The solver found no assignment.' : whole.why }
  const standing = [...desk.standingAffinity.values()].reduce((sum, one) => sum + one, 0)
  return { outcome, sumBound: relaxed.bound + outsideCost(desk) * outcome.outsidePages + standing }
}

/** The relaxation made whole, and improved along each of the ways. */
function exchanged(
  desk: OpenedDesk,
  relaxed: Float64Array,
  floor: number,
  describe: (chosen: Candidate[]) => Outcome,
): { pairs: Set<Candidate>; outcome: Outcome } {
  const columns = [...desk.candidates.entries()]
    .map(([column, candidate]) => ({ candidate, part: relaxed[column] ?? 0 }))
    .sort((a, b) => b.part - a.part || b.candidate.affinity - a.candidate.affinity)
  const open = new Map(desk.demands.map(({ proposal, wanted }) => [proposal.id, wanted]))
  const whole = columns.flatMap(({ candidate }) => {
    const left = open.get(candidate.proposal) ?? 0
    if (left === 0) return []
    open.set(candidate.proposal, left - 1)
    return [candidate]
  })
  const cost = outsideCost(desk)
  const ways = PRICES.map((price) => {
    const floorCost = price.floorCost * cost
    const first = improveBySwaps(desk, whole, { floor, floorCost, pageCost: price.pageCost * cost })
    const pairs = improveBySwaps(desk, first, { floor, floorCost, pageCost: cost })
    return { pairs: new Set(pairs), outcome: describe(pairs) }
  })
  return ways.reduce((best, way) => (isBetter(way.outcome, best.outcome) ? way : best))
}

/** Loads first, then the worst-served proposal, then the sum. */
function isBetter(one: Outcome, other: Outcome): boolean {
  if (one.outsidePages !== other.outsidePages) return one.outsidePages < other.outsidePages
  const [worst, than] = [one.worst ?? 0, other.worst ?? 0]
  return Math.abs(worst - than) > ROUNDING ? worst > than : one.sum > other.sum
}
