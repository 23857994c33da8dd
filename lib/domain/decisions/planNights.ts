import { awardsOutside } from '@/db/queries/awardsOutside'
import { rankingEntries } from '@/db/queries/rankings'
import { standingContents } from '@/db/queries/versions'
import type { RankingsRow } from '@/db/tables'
import { keptBins, keptLine } from '@/lib/panel/nights/allowFor'
import type { BinnedLine, BinnedPlan, NightBin } from '@/lib/panel/nights/binTypes'
import { byRankInBins } from '@/lib/panel/nights/byRankInBins'
import type { ActingContext } from '../context'
import { binnedLine } from '../nights/binnedLine'
import { callBins, type CallBins } from '../nights/callBins'
import type { PanelDesk } from '../panels/openPanel'
import { visibleLine, visibleOrder } from '../rankings/order'
import { arrangeAsked, type ArrangedAsked } from './arrangeAsked'
import { keptForOthers } from './keptForOthers'
import { meritOf } from './meritOf'
import { planByMerit } from './planByMerit'
import { planTerms, type PlanTerms } from './planTerms'
import { nightsPolicy, type NightsPolicy } from './policyWords'
import { summaryOf, type PolicySummary } from './policySummary'
import type { Trial } from './trialSchema'
import { wantedLines, type WantedLine } from './wantedLines'

export interface PlannedNights {
  order: number[]
  line: number
  setAside: ReadonlySet<number>
  wanted: WantedLine[]
  season: CallBins
  terms: PlanTerms
  /** What may be planned with: the season's bins less weather and what is held back. */
  bins: NightBin[]
  asked: ArrangedAsked
  /** Given by other panels, kept for them by the order of all panels, or given to proposals the asker may not see. */
  standing: BinnedLine[]
  policy: NightsPolicy
  plan: BinnedPlan
  /** Every policy side by side, to choose between; none where that was not asked for. */
  policies: PolicySummary[]
}

/** A line to lay, as it was asked or given. */
interface LineFacts {
  proposalId: number
  instrumentId: number
  telescopeId: number
  seconds: number
  least: number
  possible: boolean
}

export interface PlanOptions {
  policy?: NightsPolicy
  trial?: Trial
  /** Whether every policy is wanted: the solver takes its time, and verbs hold locks. */
  sideBySide?: boolean
}

/**
 * The suggestion for the nights by a policy, in the bins each proposal can use, over what the asker may see and
 * what is given elsewhere. By rank where the other policy finds no answer. A trial is put over the terms that stand.
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
  const elsewhere = await awardsOutside(ctx.db, desk.call.id, order)
  const [wanted, season, contents] = await Promise.all([
    wantedLines(ctx.db, order),
    callBins(ctx.db, desk.call),
    standingContents(ctx.db, [...order, ...elsewhere.map(({ proposalId }) => proposalId)]),
  ])
  const terms = await planTerms(ctx.db, desk.call, season, { proposalIds: order, trial })
  const bins = keptBins(season.bins, terms.kept)
  const binned = (facts: LineFacts): BinnedLine[] => {
    const held = contents.get(facts.proposalId)
    if (!held) return []
    const { proposalId: proposal, instrumentId: instrument, telescopeId: telescope, ...rest } = facts
    const { seconds, least, possible } = rest
    const line = { proposal, instrument, telescope, seconds, least, possible }
    return [keptLine(binnedLine(line, held, season), terms.kept)]
  }
  const given = elsewhere.flatMap((line) => binned({ ...line, least: line.seconds, possible: true }))
  const kept = await keptForOthers(ctx.db, desk, { season, terms, bins, standing: given })
  const standing = [...given, ...kept]
  const asked = await arrangeAsked(
    order
      .filter((id) => !setAside.has(id))
      .map((id) =>
        wanted
          .filter((line) => line.proposalId === id)
          .flatMap((line) => binned({ ...line, seconds: line.wholeSeconds, least: line.leastSeconds })),
      )
      .filter((lines) => lines.length > 0),
    terms.choices,
    { bins, standing },
  )
  const line = visibleLine(full, desk.hidden, ranking.line_after ?? 0)
  return {
    ...{ order, line, setAside, wanted, season, terms, bins, asked, standing },
    ...(await planned(ctx, desk, {
      ...{ policy, sideBySide, asked, bins, standing },
      above: new Set(order.slice(0, line)),
    })),
  }
}

/** The plan of a policy, and what each would come to. */
async function planned(
  ctx: Pick<ActingContext, 'db'>,
  desk: PanelDesk,
  given: Pick<PlannedNights, 'policy' | 'asked' | 'bins' | 'standing'> & {
    sideBySide: boolean
    above: ReadonlySet<number>
  },
): Promise<Pick<PlannedNights, 'policy' | 'plan' | 'policies'>> {
  const { policy, sideBySide, asked, bins, standing, above } = given
  const byRank = byRankInBins(asked.inTurn, bins, standing)
  if (policy === 'rank' && !sideBySide) return { policy, plan: byRank, policies: [] }
  const merit = await meritOf(ctx.db, desk)
  const byMerit = await planByMerit({
    asked: [...asked.byRank, ...asked.fillers],
    line: asked.byRank.filter(([first]) => first && above.has(first.proposal)).length,
    bins,
    standing,
    merit,
    must: asked.must,
  })
  const hasMerit = !('why' in byMerit)
  const summarised = { rank: byRank, merit: hasMerit ? byMerit : null }
  return {
    policy: policy === 'merit' && hasMerit ? 'merit' : 'rank',
    plan: policy === 'merit' && hasMerit ? byMerit : byRank,
    policies: nightsPolicy.options.map((name) =>
      summaryOf(name, summarised[name], { above, merit, why: hasMerit ? null : byMerit.why }),
    ),
  }
}
