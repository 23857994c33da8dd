import { findCall } from '@/db/queries/calls'
import { layOnTable, tableOfPanel } from '@/db/queries/discussion'
import { lockPanel, panelMembers, seatsHeld } from '@/db/queries/panel'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { barredPairs } from '../conflicts/barredPairs'
import type { ActingContext } from '../context'
import { canSitAtTable } from '../discussions/policy'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { recuse } from './recuse'
import type { LeaveTableInput } from './schema'

/**
 * A member finds an interest in what is discussed: from this moment on nothing of it is shown to them, and a review of
 * theirs no longer counts. Where too few are left to discuss it, the table is cleared.
 */
export function leaveTable(ctx: ActingContext, input: LeaveTableInput): Promise<{ isCleared: boolean }> {
  return inTransaction(ctx, async (tx) => {
    const locked = await lockPanel(tx.db, input.panelId)
    const call = locked ? await findCall(tx.db, locked.callId) : null
    if (!call) throw refuse.notFound('panel')
    const { personId } = tx.actor
    const panel = (await seatsHeld(tx.db, call.id, personId)).find(({ id }) => id === input.panelId)
    if (!panel) throw refuse.notFound('panel')
    authorize(canSitAtTable(tx.actor, { id: panel.id, callId: call.id }))
    const table = await tableOfPanel(tx.db, panel.id)
    const members = (await panelMembers(tx.db, panel.id)).map((member) => member.personId)
    const barred = (await barredPairs(tx.db, call.id, [...new Set([...members, personId])])).filter(
      ({ proposalId }) => proposalId === input.proposalId,
    )
    if (table.proposalId !== input.proposalId || barred.some((pair) => pair.personId === personId))
      throw refuse.notFound('discussion')

    const withdrawn = await recuse(tx, call, input)
    const apart = new Set([personId, ...barred.map((pair) => pair.personId)])
    const voices = members.filter((id) => table.present.has(id) && !apart.has(id)).length
    const isCleared = voices < panel.quorum
    if (isCleared) await layOnTable(tx.db, panel.id, null)
    await writeLogbook(tx, {
      action: 'leaveTable',
      subject: { kind: 'proposal', id: input.proposalId },
      actingAs: 'reviewer',
      after: { kind: input.kind, reason: input.reason, reviewsWithdrawn: withdrawn, tableCleared: isCleared },
    })
    return { isCleared }
  })
}
