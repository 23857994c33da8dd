import { findCall } from '@/db/queries/calls'
import { databaseNow } from '@/db/queries/clock'
import { lockCall } from '@/db/queries/decisions'
import { lockPanel, panelProposals, seatsHeld, type PanelProposal } from '@/db/queries/panel'
import { refuse } from '@/lib/errors'
import { holds } from '../actor'
import { callPhase } from '../calls/rules'
import { barredFrom } from '../conflicts/barredPairs'
import type { ActingContext } from '../context'
import { canLeadPanel } from '../panels/policy'

export interface ApprovalDesk {
  panelId: number
  actingAs: 'chair' | 'office'
  /** Proposals of the panel in which this person has no interest. */
  proposals: PanelProposal[]
}

/**
 * The panel, locked with its call, for someone who may stand behind its decisions: whoever leads it, or the office.
 * What they have an interest in is not there for them.
 */
export async function openForApproval(tx: ActingContext, panelId: number): Promise<ApprovalDesk> {
  const panel = await lockPanel(tx.db, panelId)
  if (!panel) throw refuse.notFound('panel')
  await lockCall(tx.db, panel.callId)
  const call = await findCall(tx.db, panel.callId)
  if (!call) throw refuse.notFound('panel')
  const seat = (await seatsHeld(tx.db, call.id, tx.actor.personId)).find(({ id }) => id === panelId)
  const leads = seat !== undefined && canLeadPanel(tx.actor, { ...seat, callId: call.id }).allowed
  if (!leads && !holds(tx.actor, 'office')) throw refuse.notFound('panel')
  if (callPhase(call, await databaseNow(tx.db)) !== 'ranking')
    throw refuse.closed('Decisions are approved between the ranking and the day they are made known.')
  const hidden = await barredFrom(tx.db, tx.actor.personId, call.id)
  return {
    panelId,
    actingAs: leads ? 'chair' : 'office',
    proposals: (await panelProposals(tx.db, panelId)).filter(({ id }) => !hidden.has(id)),
  }
}
