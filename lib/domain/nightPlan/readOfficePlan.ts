import { awardedProposals } from '@/db/queries/awardedProposals'
import { findCallBySlug } from '@/db/queries/calls'
import { standingDecisions } from '@/db/queries/decisions'
import { snapshotHeads } from '@/db/queries/snapshotHeads'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { keptBins } from '@/lib/panel/nights/allowFor'
import { mayManageCalls } from '../calls/policy'
import type { Context } from '../context'
import { givenRuns } from '../decisions/linesToRun'
import { planTerms } from '../decisions/planTerms'
import { callBins } from '../nights/callBins'
import { partsOf } from './partsOf'
import type { NightPlan } from './types'

/** The night plan of every award of a call that is made known, by reference, for the office. */
export async function readOfficePlan(ctx: Context, callSlug: string): Promise<NightPlan> {
  authorize(mayManageCalls(ctx.actor))
  const call = await findCallBySlug(ctx.db, callSlug)
  if (!call) throw refuse.notFound('call')
  const awarded = await awardedProposals(ctx.db, call.id)
  const order = awarded.map(({ id }) => id)
  const season = await callBins(ctx.db, call)
  const terms = await planTerms(ctx.db, call, season, { proposalIds: order, trial: undefined })
  const bins = keptBins(season.bins, terms.kept)
  const [runs, decisions, heads] = await Promise.all([
    givenRuns(ctx.db, { order, season, bins, terms }),
    standingDecisions(ctx.db, order),
    snapshotHeads(ctx.db, order),
  ])
  return {
    callNumber: call.number,
    callSlug: call.slug,
    version: [...decisions.values()].reduce((sum, { version }) => sum + version, 0),
    parts: partsOf(runs, { season, bins, terms, standing: [] }, (id) => ({
      number: awarded.find((proposal) => proposal.id === id)?.reference ?? '',
      title: heads.get(id)?.title ?? '',
      rank: null,
    })),
  }
}
