import { awardedProposals } from '@/db/queries/awardedProposals'
import { findCallBySlug } from '@/db/queries/calls'
import { siteRecordAt } from '@/db/queries/facility'
import { standingAwards, standingDecisions } from '@/db/queries/decisions'
import { snapshotHeads } from '@/db/queries/snapshotHeads'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { mayManageCalls } from '../calls/policy'
import type { Context } from '../context'
import { givenRuns } from '../decisions/linesToRun'
import { givenSeason } from '../visits/givenVisits'
import { partsOf } from './partsOf'
import { visitPartsOf } from './visitPartsOf'
import type { NightPlan } from './types'

/** The night plan of every award of a call that is made known, by reference, for the office. */
export async function readOfficePlan(ctx: Context, callSlug: string): Promise<NightPlan> {
  authorize(mayManageCalls(ctx.actor))
  const call = await findCallBySlug(ctx.db, callSlug)
  if (!call) throw refuse.notFound('call')
  const awarded = await awardedProposals(ctx.db, call.id)
  const order = awarded.map(({ id }) => id)
  const given = await givenSeason(ctx.db, call, order)
  const [runs, awards, site, decisions, heads] = await Promise.all([
    givenRuns(ctx.db, given),
    standingAwards(ctx.db, order),
    siteRecordAt(ctx.db, call.siteId, call.seasonFrom),
    standingDecisions(ctx.db, order),
    snapshotHeads(ctx.db, order),
  ])
  const factsOf = (id: number) => ({
    number: awarded.find((proposal) => proposal.id === id)?.reference ?? '',
    title: heads.get(id)?.title ?? '',
    rank: null,
  })
  return {
    callNumber: call.number,
    callSlug: call.slug,
    version: [...decisions.values()].reduce((sum, { version }) => sum + version, 0),
    parts: [
      ...partsOf(runs, { ...given, standing: [] }, factsOf),
      ...visitPartsOf(given, awards, site.name, factsOf),
    ],
  }
}
