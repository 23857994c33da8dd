import { panelsOfCall } from '@/db/queries/approvals'
import { findCallBySlug } from '@/db/queries/calls'
import { databaseNow } from '@/db/queries/clock'
import { panelProposals } from '@/db/queries/panel'
import { currentRanking } from '@/db/queries/rankings'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { mayManageCalls } from '../calls/policy'
import { callPhase } from '../calls/rules'
import { barredFrom } from '../conflicts/barredPairs'
import type { ActingContext } from '../context'
import { decisionRows } from './decisionRows'
import type { OfficeDecisionsView } from './officeDecisionsView'

/** What the panels of a call have prepared, for the office as second person; without what its reader has an interest in. */
export async function readOfficeDecisions(ctx: ActingContext, slug: string): Promise<OfficeDecisionsView> {
  authorize(mayManageCalls(ctx.actor))
  const call = await findCallBySlug(ctx.db, slug)
  if (!call) throw refuse.notFound('call')
  const hidden = await barredFrom(ctx.db, ctx.actor.personId, call.id)
  const panels = []
  for (const panel of await panelsOfCall(ctx.db, call.id)) {
    const ranking = await currentRanking(ctx.db, panel.id)
    const proposals = (await panelProposals(ctx.db, panel.id)).filter(({ id }) => !hidden.has(id))
    panels.push({
      panelId: panel.id,
      name: panel.name,
      isFrozen: Boolean(ranking?.frozen_at),
      rows: await decisionRows(ctx, { callId: call.id, panelId: panel.id, proposals, hidden, ranking }),
    })
  }
  return {
    callNumber: call.number,
    callSlug: call.slug,
    phase: callPhase(call, await databaseNow(ctx.db)),
    lettersAt: call.lettersAt.toISOString(),
    panels,
  }
}
