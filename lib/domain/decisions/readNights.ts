import { standingAwards, standingDecisions } from '@/db/queries/decisions'
import { offeredTime } from '@/db/queries/panel'
import { currentRanking } from '@/db/queries/rankings'
import { snapshotHeads } from '@/db/queries/snapshotHeads'
import type { ActingContext } from '../context'
import { openPanel } from '../panels/openPanel'
import { callBins } from '../nights/callBins'
import type { NightsBin, NightsRow, NightsView } from './nightsView'
import { planNights, type PlannedNights } from './planNights'
import type { NightsPolicy } from './nightsPolicySchema'
import { whyNotGiven } from './whyNotGiven'

/** The bins of a telescope, with what the suggestion lays there. */
function binsOf(
  season: PlannedNights['season'],
  planned: PlannedNights | null,
  telescope: number,
): NightsBin[] {
  return season.bins.flatMap(({ instrument: _, ...bin }, index) => {
    if (bin.telescope !== telescope) return []
    const given = planned?.plan.given ?? []
    const usedSeconds = given.reduce((sum, { laid }) => sum + (laid.get(index) ?? 0), 0)
    const { half, siderealFromH, moon, seconds } = bin
    return [{ half, siderealFromH, moon, seconds, usedSeconds }]
  })
}

/** Hours on offer and hours given, as their reader may see them. */
export async function readNights(
  ctx: ActingContext,
  key: { callSlug: string; panelId?: number; policy?: NightsPolicy },
): Promise<NightsView> {
  const desk = await openPanel(ctx, key)
  const ranking = await currentRanking(ctx.db, desk.panel.id)
  const blocks = await offeredTime(ctx.db, desk.call.id)
  const planned = ranking ? await planNights(ctx, desk, ranking, key.policy) : null
  const season = planned?.season ?? (await callBins(ctx.db, desk.call))
  const order = planned?.order ?? []
  const [heads, awards, decisions] = await Promise.all([
    snapshotHeads(ctx.db, order),
    standingAwards(ctx.db, order),
    standingDecisions(ctx.db, order),
  ])
  const numberOf = (id: number) => desk.proposals.find((proposal) => proposal.id === id)?.reviewNumber ?? ''
  const rows = order.map((id, index): NightsRow => ({
    proposalId: id,
    reviewNumber: numberOf(id),
    title: heads.get(id)?.title ?? '',
    rank: index + 1,
    isAbove: index < (planned?.line ?? 0),
    setAside: planned?.setAside.has(id) ?? false,
    decisionVersion: decisions.get(id)?.version ?? 0,
    lines: (planned?.wanted ?? [])
      .filter((line) => line.proposalId === id)
      .map((line) => {
        const is = (one: { proposal: number; instrument: number }) =>
          one.proposal === id && one.instrument === line.instrumentId
        const given = awards.find((a) => a.proposalId === id && a.instrumentId === line.instrumentId)
        return {
          ...line,
          givenSeconds: given?.seconds ?? 0,
          isReserve: given?.isReserve ?? false,
          service: given?.service ?? 'queue',
          conditions: given?.conditions ?? '',
          suggestedSeconds: planned?.plan.given.find(is)?.seconds ?? 0,
          whyNot: planned ? whyNotGiven(planned, id, line.instrumentId, numberOf) : null,
        }
      }),
  }))
  const all = rows.flatMap((row) => row.lines)
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
    rows,
    telescopes: [...new Set(blocks.map((block) => block.telescopeId))].map((id) => {
      const own = blocks.filter((block) => block.telescopeId === id)
      const lines = all.filter((line) => line.telescopeId === id)
      return {
        id,
        name: own[0]?.telescope ?? '',
        offeredSeconds: own.reduce((sum, block) => sum + block.seconds, 0),
        givenSeconds: lines.reduce((sum, line) => sum + (line.isReserve ? 0 : line.givenSeconds), 0),
        suggestedSeconds: lines.reduce((sum, line) => sum + line.suggestedSeconds, 0),
        bins: binsOf(season, planned, id),
      }
    }),
  }
}
