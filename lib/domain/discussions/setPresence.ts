import { findCall } from '@/db/queries/calls'
import { notePresence } from '@/db/queries/discussion'
import { lockPanel, seatsHeld } from '@/db/queries/panel'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { canLeadPanel } from '../panels/policy'
import type { PresenceInput } from './schema'

/** Notes who is at the meeting: a member for themselves, whoever leads the panel for anyone on it. */
export function setPresence(ctx: ActingContext, input: PresenceInput): Promise<void> {
  return inTransaction(ctx, async (tx) => {
    const panel = await lockPanel(tx.db, input.panelId)
    const call = panel ? await findCall(tx.db, panel.callId) : null
    if (!call) throw refuse.notFound('panel')
    const seat = (await seatsHeld(tx.db, call.id, tx.actor.personId)).find(({ id }) => id === input.panelId)
    if (!seat) throw refuse.notFound('panel')
    const leads = canLeadPanel(tx.actor, { ...seat, callId: call.id }).allowed
    if (!leads && input.personId !== tx.actor.personId) throw refuse.notFound('member')
    if (!(await notePresence(tx.db, input.panelId, input.personId, input.isPresent)))
      throw refuse.notFound('member')
    await writeLogbook(tx, {
      action: 'panel.presence',
      subject: { kind: 'person', id: input.personId },
      actingAs: leads ? 'chair' : 'reviewer',
      after: { panelId: input.panelId, isPresent: input.isPresent },
    })
  })
}
