import { awardsOutside } from '@/db/queries/awardsOutside'
import { rankingEntries } from '@/db/queries/rankings'
import { standingContents } from '@/db/queries/versions'
import { standingHalves } from '@/db/queries/visits'
import type { RankingsRow } from '@/db/tables'
import type { BinnedLine, BinnedPlan, NightBin } from '@/lib/panel/nights/binTypes'
import type { ActingContext } from '../context'
import { callBins, type CallBins } from '../nights/callBins'
import type { PanelDesk } from '../panels/openPanel'
import { visibleLine, visibleOrder } from '../rankings/order'
import { datedHalves } from '../visits/datedHalves'
import { planVisits, type VisitPlan } from '../visits/planVisits'
import { visitLines } from '../visits/visitLines'
import { withoutVisits } from '../visits/withoutVisits'
import type { ArrangedAsked } from './arrangeAsked'
import { divideQueue } from './divideQueue'
import { planTerms, type PlanTerms } from './planTerms'
import type { NightsPolicy } from './policyWords'
import type { PolicySummary } from './policySummary'
import type { Trial } from './trialSchema'
import { wantedLines, type WantedLine } from './wantedLines'

export interface PlannedNights {
  order: number[]
  line: number
  setAside: ReadonlySet<number>
  wanted: WantedLine[]
  /** As the call has it, less what others' visits have of it. */
  whole: CallBins
  /** What the visits suggested leave of it, for the queue. */
  season: CallBins
  terms: PlanTerms
  /** What may be planned with: the season's bins less weather and what is held back. */
  bins: NightBin[]
  asked: ArrangedAsked
  /** Given by other panels, kept for them by the order of all panels, or given to proposals the asker may not see. */
  standing: BinnedLine[]
  policy: NightsPolicy
  /** Visits among what is given, without bins. */
  plan: BinnedPlan
  visits: VisitPlan
  /** Every policy side by side, to choose between; none where that was not asked for. */
  policies: PolicySummary[]
}

export interface PlanOptions {
  policy?: NightsPolicy
  trial?: Trial
  /** Whether every policy is wanted: the solver takes its time, and verbs hold locks. */
  sideBySide?: boolean
}

/**
 * The suggestion for the nights by a policy, over what the asker may see and what is given elsewhere: visits first, on
 * dates, in their turns as far down as the line; then the queue in the bins each proposal can use, over what they leave.
 * By rank where the other policy finds no answer. A trial is put over the terms that stand.
 */
export async function planNights(
  ctx: Pick<ActingContext, 'db'>,
  desk: PanelDesk,
  ranking: RankingsRow,
  { policy = 'rank', trial, sideBySide = false }: PlanOptions = {},
): Promise<PlannedNights> {
  const entries = await rankingEntries(ctx.db, ranking.id)
  const full = entries.map((entry) => entry.proposal_id)
  const shown = new Set(desk.proposals.map(({ id }) => id))
  const order = visibleOrder(full, desk.hidden).filter((id) => shown.has(id))
  const setAside = new Set(
    entries.flatMap((entry) => (entry.set_aside_at === null ? [] : [entry.proposal_id])),
  )
  const line = visibleLine(full, desk.hidden, ranking.line_after ?? 0)
  const above = new Set(order.slice(0, line))
  const elsewhere = await awardsOutside(ctx.db, desk.call.id, order)
  const [wanted, offered, contents, halves] = await Promise.all([
    wantedLines(ctx.db, order),
    callBins(ctx.db, desk.call),
    standingContents(ctx.db, [...order, ...elsewhere.map(({ proposalId }) => proposalId)]),
    standingHalves(ctx.db, desk.call.id),
  ])
  const others = halves.filter(({ proposalId }) => !order.includes(proposalId))
  const whole = withoutVisits(offered, datedHalves(others, offered.dark))
  const { choices } = await planTerms(ctx.db, desk.call, whole, { proposalIds: order, trial })
  const shared = { order, line, setAside, wanted, whole }
  const excluded = new Set<number>()
  for (;;) {
    const own = visitLines(wanted, { order, above, setAside, choices })
    const lines = own.filter(({ proposalId }) => !excluded.has(proposalId))
    const visits = await planVisits(lines, contents, whole, desk.call.seasonFrom)
    const season = withoutVisits(
      whole,
      visits.dated.flatMap((visit) => visit.halves),
    )
    const terms = await planTerms(ctx.db, desk.call, season, { proposalIds: order, trial })
    const queue = await divideQueue(ctx, desk, {
      ...{ ...shared, elsewhere, contents, season, terms, visits, above, policy, sideBySide },
    })
    // A visit is of no use without the hours in the queue that its proposal asks for beside it.
    const alone = visits.dated.filter(({ proposal }) => queue.withoutQueue.has(proposal))
    if (alone.length === 0) return { ...shared, season, terms, visits, ...queue }
    for (const { proposal } of alone) excluded.add(proposal)
  }
}
