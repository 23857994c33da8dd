import { standingAwards, standingDecisions } from '@/db/queries/decisions'
import { standingChoices } from '@/db/queries/nightTerms'
import { offeredTime } from '@/db/queries/panel'
import { currentRanking } from '@/db/queries/rankings'
import { standingHalves } from '@/db/queries/visits'
import { snapshotHeads } from '@/db/queries/snapshotHeads'
import type { ActingContext } from '../context'
import { callBins } from '../nights/callBins'
import { openPanel } from '../panels/openPanel'
import { eveningsText } from '../visits/readEvenings'
import { visitKey, whyNotVisits } from '../visits/whyNotVisits'
import { nightsTelescope } from './nightsTelescope'
import type { NightsRow, NightsView } from './nightsView'
import { planNights, type PlannedNights } from './planNights'
import type { NightsPolicy } from './policyWords'
import { isTried, type Trial } from './trialSchema'
import { whyNotGiven } from './whyNotGiven'

const secondsIn = (planned: PlannedNights | null, proposalId: number, instrumentId: number): number =>
  planned?.plan.given.find((one) => one.proposal === proposalId && one.instrument === instrumentId)
    ?.seconds ?? 0

/** Share of the dark time in the bins that the weather is counted to take. */
function lostShare({ season, terms }: PlannedNights): number {
  const dark = season.bins.reduce((sum, { seconds }) => sum + seconds, 0)
  const lost = season.bins.reduce(
    (sum, { half, seconds }) => sum + seconds * (terms.weather.lostByHalf[half] ?? 0),
    0,
  )
  return dark > 0 ? lost / dark : 0
}

/** Hours on offer and hours given, as their reader may see them. With a trial, what it would change. */
export async function readNights(
  ctx: ActingContext,
  key: { callSlug: string; panelId?: number; policy?: NightsPolicy; trial?: Trial },
): Promise<NightsView> {
  const desk = await openPanel(ctx, key)
  const ranking = await currentRanking(ctx.db, desk.panel.id)
  const trial = isTried(key.trial) ? key.trial : undefined
  const { policy } = key
  const blocks = await offeredTime(ctx.db, desk.call.id)
  const planned = ranking ? await planNights(ctx, desk, ranking, { policy, trial, sideBySide: true }) : null
  const stands = ranking && trial ? await planNights(ctx, desk, ranking, { policy }) : null
  const season = planned?.whole ?? (await callBins(ctx.db, desk.call))
  const order = planned?.order ?? []
  const [heads, awards, halves, decisions, choices] = await Promise.all([
    snapshotHeads(ctx.db, order),
    standingAwards(ctx.db, order),
    standingHalves(ctx.db, desk.call.id),
    standingDecisions(ctx.db, order),
    standingChoices(ctx.db, order),
  ])
  const numberOf = (id: number) => desk.proposals.find((proposal) => proposal.id === id)?.reviewNumber ?? ''
  const whyVisits = planned ? await whyNotVisits(planned, numberOf) : null
  const rows = order.map((id, index): NightsRow => ({
    proposalId: id,
    reviewNumber: numberOf(id),
    title: heads.get(id)?.title ?? '',
    rank: index + 1,
    isAbove: index < (planned?.line ?? 0),
    setAside: planned?.setAside.has(id) ?? false,
    choice: choices.get(id) ?? null,
    tried: trial?.choices?.[id] ?? null,
    decisionVersion: decisions.get(id)?.version ?? 0,
    lines: (planned?.wanted ?? [])
      .filter((line) => line.proposalId === id)
      .map((line) => {
        const given = awards.find((a) => a.proposalId === id && a.instrumentId === line.instrumentId)
        return {
          ...line,
          givenSeconds: given?.seconds ?? 0,
          isReserve: given?.isReserve ?? false,
          service: given?.service ?? 'queue',
          conditions: given?.conditions ?? '',
          evenings: eveningsText(
            halves.filter((half) => half.proposalId === id && half.instrumentId === line.instrumentId),
          ),
          suggestedEvenings: eveningsText(
            planned?.visits.dated.find(
              (visit) => visit.proposal === id && visit.instrument === line.instrumentId,
            )?.halves ?? [],
          ),
          suggestedSeconds: secondsIn(planned, id, line.instrumentId),
          standsSeconds: stands ? secondsIn(stands, id, line.instrumentId) : null,
          whyNot:
            whyVisits?.get(visitKey(id, line.instrumentId)) ??
            (planned ? whyNotGiven(planned, id, line.instrumentId, numberOf) : null),
        }
      }),
  }))
  const lines = rows.flatMap((row) => row.lines)
  return {
    panelId: desk.panel.id,
    callNumber: desk.call.number,
    callSlug: desk.call.slug,
    seasonFrom: desk.call.seasonFrom,
    phase: desk.phase,
    hasRanking: ranking !== null,
    policy: planned?.policy ?? 'rank',
    policies: planned?.policies ?? [],
    line: planned?.line ?? 0,
    weather: { isRecorded: season.weather !== null, lostShare: planned ? lostShare(planned) : 0 },
    conflict: (planned?.asked.conflict ?? []).map(numberOf),
    isTrial: trial !== undefined,
    rows,
    telescopes: [...new Set(blocks.map((block) => block.telescopeId))].map((id) =>
      nightsTelescope(id, { blocks, season, planned, lines }),
    ),
  }
}
