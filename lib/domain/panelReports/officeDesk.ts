import { callPanels } from '@/db/queries/callPanels'
import { findCallBySlug } from '@/db/queries/calls'
import { databaseNow } from '@/db/queries/clock'
import { panelProposals } from '@/db/queries/panel'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { mayManageCalls } from '../calls/policy'
import { callPhase } from '../calls/rules'
import { barredFrom } from '../conflicts/barredPairs'
import type { ActingContext } from '../context'
import type { ReadPanel } from '../panels/openPanel'

/** A panel as the office reads it: proposals in which the reader has an interest are not in it. */
export async function officeDesk(
  ctx: ActingContext,
  key: { callSlug: string; panelId: number },
): Promise<ReadPanel> {
  authorize(mayManageCalls(ctx.actor))
  const call = await findCallBySlug(ctx.db, key.callSlug)
  const panel = call && (await callPanels(ctx.db, call.id)).find(({ id }) => id === key.panelId)
  if (!call || !panel) throw refuse.notFound('panel')
  const hidden = await barredFrom(ctx.db, ctx.actor.personId, call.id)
  const now = await databaseNow(ctx.db)
  const all = await panelProposals(ctx.db, panel.id)
  return {
    ...{ call, now, hidden, phase: callPhase(call, now) },
    panel: { id: panel.id, name: panel.name, quorum: panel.quorum },
    proposals: all.filter(({ id }) => !hidden.has(id)),
  }
}
