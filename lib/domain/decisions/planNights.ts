import { awardsOutside } from '@/db/queries/awardsOutside'
import { rankingEntries } from '@/db/queries/rankings'
import { standingContents } from '@/db/queries/versions'
import type { RankingsRow } from '@/db/tables'
import type { BinnedLine, BinnedPlan } from '@/lib/panel/nights/binTypes'
import { byRankInBins } from '@/lib/panel/nights/byRankInBins'
import type { ActingContext } from '../context'
import { binnedLine } from '../nights/binnedLine'
import { callBins } from '../nights/callBins'
import type { SeasonBins } from '../nights/seasonBins'
import type { PanelDesk } from '../panels/openPanel'
import { meritOf } from './meritOf'
import { planByMerit } from './planByMerit'
import { nightsPolicy, type NightsPolicy } from './nightsPolicySchema'
import { summaryOf, type PolicySummary } from './policySummary'
import { visibleLine, visibleOrder } from '../rankings/order'
import { wantedLines, type WantedLine } from './wantedLines'

export interface PlannedNights {
  order: number[]
  line: number
  setAside: ReadonlySet<number>
  wanted: WantedLine[]
  season: SeasonBins
  /** In ranking order, without what is set aside. */
  asked: BinnedLine[][]
  /** Given by other panels, or to proposals that the asker may not see. */
  standing: BinnedLine[]
  policy: NightsPolicy
  plan: BinnedPlan
  /** Every policy side by side, to choose between. */
  policies: PolicySummary[]
}

/**
 * The suggestion for the nights by a policy, in the bins each proposal can use, over what the asker may see and
 * what is given elsewhere. By rank where the other policy finds no answer.
 */
export async function planNights(
  ctx: Pick<ActingContext, 'db'>,
  desk: PanelDesk,
  ranking: RankingsRow,
  policy: NightsPolicy = 'rank',
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
  const binned = (line: {
    proposalId: number
    instrumentId: number
    telescopeId: number
    seconds: number
    least: number
    possible: boolean
  }): BinnedLine[] => {
    const held = contents.get(line.proposalId)
    const {
      proposalId: proposal,
      instrumentId: instrument,
      telescopeId: telescope,
      seconds,
      least,
      possible,
    } = line
    return held
      ? [binnedLine({ proposal, instrument, telescope, seconds, least, possible }, held, season)]
      : []
  }
  const asked = order
    .filter((id) => !setAside.has(id))
    .map((id) =>
      wanted
        .filter((line) => line.proposalId === id)
        .flatMap((line) => binned({ ...line, seconds: line.wholeSeconds, least: line.leastSeconds })),
    )
    .filter((lines) => lines.length > 0)
  const standing = elsewhere.flatMap((line) => binned({ ...line, least: line.seconds, possible: true }))
  const line = visibleLine(full, desk.hidden, ranking.line_after ?? 0)
  const above = new Set(order.slice(0, line))
  const merit = await meritOf(ctx.db, desk)
  const byRank = byRankInBins(asked, season.bins, standing)
  const byMerit = await planByMerit({
    asked,
    line: asked.filter(([first]) => first && above.has(first.proposal)).length,
    bins: season.bins,
    standing,
    merit,
  })
  const hasMerit = !('why' in byMerit)
  const summarised = { rank: byRank, merit: hasMerit ? byMerit : null }
  return {
    order,
    line,
    setAside,
    wanted,
    season,
    asked,
    standing,
    policy: policy === 'merit' && hasMerit ? 'merit' : 'rank',
    plan: policy === 'merit' && hasMerit ? byMerit : byRank,
    policies: nightsPolicy.options.map((name) =>
      summaryOf(name, summarised[name], { above, merit, why: hasMerit ? null : byMerit.why }),
    ),
  }
}
