import { standingAwards, standingDecisions } from '@/db/queries/decisions'
import { siteRecordAt } from '@/db/queries/facility'
import { currentRanking } from '@/db/queries/rankings'
import { snapshotHeads } from '@/db/queries/snapshotHeads'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { givenRuns } from '../decisions/linesToRun'
import { planNights } from '../decisions/planNights'
import { openPanel } from '../panels/openPanel'
import { givenSeason } from '../visits/givenVisits'
import { partsOf } from './partsOf'
import { visitPartsOf } from './visitPartsOf'
import type { NightPlan } from './types'

/** The night plan of a panel's awards, by review number, as its leader may see them. */
export async function readPanelPlan(
  ctx: ActingContext,
  key: { callSlug: string; panelId?: number },
): Promise<NightPlan> {
  const desk = await openPanel(ctx, key)
  const ranking = await currentRanking(ctx.db, desk.panel.id)
  if (!ranking) throw refuse.closed('There is no plan yet: the ranking has not begun.')
  const planned = await planNights(ctx, desk, ranking)
  const { order, standing } = planned
  const given = await givenSeason(ctx.db, desk.call, order)
  const [runs, awards, site, decisions, heads] = await Promise.all([
    givenRuns(ctx.db, given),
    standingAwards(ctx.db, order),
    siteRecordAt(ctx.db, desk.call.siteId, desk.call.seasonFrom),
    standingDecisions(ctx.db, order),
    snapshotHeads(ctx.db, order),
  ])
  const factsOf = (id: number) => ({
    number: desk.proposals.find((proposal) => proposal.id === id)?.reviewNumber ?? '',
    title: heads.get(id)?.title ?? '',
    rank: order.indexOf(id) + 1,
  })
  return {
    callNumber: desk.call.number,
    callSlug: desk.call.slug,
    version: [...decisions.values()].reduce((sum, { version }) => sum + version, 0),
    parts: [
      ...partsOf(runs, { ...given, standing }, factsOf),
      ...visitPartsOf(given, awards, site.name, factsOf),
    ],
  }
}
