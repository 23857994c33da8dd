import { ProgrammeBuilder } from '../solver/programmeBuilder'
import type { Programme } from '../solver/types'
import type { Candidate } from './candidatePairs'
import type { Demand } from './demandOf'
import { outsideCost } from './outsideCost'
import { tieBreak } from './tieBreak'

/** What does not change from one programme to the next. */
export interface AssignmentDesk {
  demands: readonly Demand[]
  candidates: readonly Candidate[]
  reviewers: readonly number[]
  /** Standing affinity of a proposal. */
  standingAffinity: ReadonlyMap<number, number>
  /** Standing pages of a reviewer. */
  standingPages: ReadonlyMap<number, number>
  leastPages: number
  mostPages: number
  /** Weight of the tie-break against affinity. */
  tieWeight: number
}

/** What is asked: the worst-served proposal's affinity (`worst`), or the sum with at least `floor` for each proposal. */
export type Question =
  | { ask: 'worst'; isWhole: boolean }
  | { ask: 'sum'; floor: number; mostOutside: number; cuts: readonly ReadonlySet<number>[] }

/**
 * Columns: one for each candidate (0 or 1) in order, then one for the worst affinity, then two for each reviewer, the
 * pages below and above the range of loads. Such a page costs more than any affinity, so that the range is left only
 * where it must be. Rows after Stelmakh, Shah & Singh (2021, J. Mach. Learn. Res. 22, 163), section 4. A cut names a
 * group of reviewers of whom one must share a proposal with one of the others.
 */
export function assignmentProgramme(desk: AssignmentDesk, question: Question): Programme {
  const { demands, candidates, reviewers } = desk
  const builder = new ProgrammeBuilder()
  const asksWorst = question.ask === 'worst'
  const isInteger = !asksWorst || question.isWhole
  const pageCost = outsideCost(desk)
  const byProposal = new Map<number, number[]>()
  const byReviewer = new Map<number, number[]>()
  for (const { proposal, reviewer, affinity } of candidates) {
    const objective = asksWorst ? 0 : affinity + desk.tieWeight * tieBreak(proposal, reviewer)
    const column = builder.column({ objective, lower: 0, upper: 1, isInteger })
    listAt(byProposal, proposal).push(column)
    listAt(byReviewer, reviewer).push(column)
  }
  const worst = builder.column({
    objective: asksWorst ? 1 : 0,
    lower: 0,
    upper: pageCost - 1,
    isInteger: false,
  })
  const pagesOf = new Map(demands.map(({ proposal }) => [proposal.id, proposal.pages]))
  const pages = (column: number) => pagesOf.get(candidates[column]?.proposal ?? -1) ?? 0
  const outside: number[] = []
  for (const id of reviewers) {
    const limits = { objective: -pageCost, lower: 0, upper: Infinity, isInteger: false }
    const [below, above] = [builder.column(limits), builder.column(limits)]
    outside.push(below, above)
    const held = desk.standingPages.get(id) ?? 0
    const own = (byReviewer.get(id) ?? []).map((column) => [column, pages(column)] as const)
    builder.row(desk.leastPages - held, Infinity, [...own, [below, 1]])
    builder.row(-Infinity, desk.mostPages - held, [...own, [above, -1]])
  }
  for (const { proposal, wanted, lacking } of demands) {
    const own = byProposal.get(proposal.id) ?? []
    if (own.length === 0) continue
    builder.row(
      wanted,
      wanted,
      own.map((column) => [column, 1]),
    )
    if (lacking > 0) continue
    const served = own.map((column) => [column, candidates[column]?.affinity ?? 0] as const)
    const held = desk.standingAffinity.get(proposal.id) ?? 0
    if (asksWorst) builder.row(-held, Infinity, [...served, [worst, -1]])
    else if (question.floor > held + leastOf(served, wanted))
      builder.row(question.floor - held, Infinity, served)
  }
  if (!asksWorst) {
    if (question.mostOutside < Infinity)
      builder.row(
        -Infinity,
        question.mostOutside,
        outside.map((column) => [column, 1]),
      )
    for (const group of question.cuts) addCut(builder, desk, byProposal, group)
  }
  return builder.build()
}

/** For some proposal, readers on both sides: `shared <= readers of it on either side`, and one `shared` above zero. */
function addCut(
  builder: ProgrammeBuilder,
  { demands, candidates }: AssignmentDesk,
  byProposal: ReadonlyMap<number, number[]>,
  group: ReadonlySet<number>,
): void {
  const shared: number[] = []
  for (const { proposal, standing } of demands) {
    const own = byProposal.get(proposal.id) ?? []
    const sides = [true, false].map((isInside) => ({
      held: standing.filter((id) => group.has(id) === isInside).length,
      columns: own.filter((column) => group.has(candidates[column]?.reviewer ?? -1) === isInside),
    }))
    if (sides.some(({ held, columns }) => held + columns.length === 0)) continue
    const column = builder.column({ objective: 0, lower: 0, upper: 1, isInteger: false })
    shared.push(column)
    for (const { held, columns } of sides)
      builder.row(-held, Infinity, [...columns.map((own) => [own, 1] as const), [column, -1]])
  }
  builder.row(
    1,
    Infinity,
    shared.map((column) => [column, 1]),
  )
}

/** What any choice of so many readers brings: a floor no higher is no row, which would only slow the solver down. */
function leastOf(served: readonly (readonly [column: number, affinity: number])[], count: number): number {
  const sorted = served.map(([, affinity]) => affinity).sort((a, b) => a - b)
  return sorted.slice(0, count).reduce((sum, one) => sum + one, 0)
}

function listAt(map: Map<number, number[]>, key: number): number[] {
  const held = map.get(key)
  if (held) return held
  const made: number[] = []
  map.set(key, made)
  return made
}
