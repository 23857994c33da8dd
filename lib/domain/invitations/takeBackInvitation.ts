import { withdrawInvitation } from '@/db/queries/invitations'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { mayInvite } from './policy'

/** Takes an invitation back: its link stops working. */
export async function takeBackInvitation(ctx: ActingContext, input: { invitationId: number }): Promise<void> {
  authorize(mayInvite(ctx.actor))
  await inTransaction(ctx, async (tx) => {
    if (!(await withdrawInvitation(tx.db, input.invitationId)))
      throw refuse.closed('This invitation has been accepted or taken back already.')
    await writeLogbook(tx, {
      action: 'invitation.take-back',
      subject: { kind: 'invitation', id: input.invitationId },
      actingAs: 'office',
    })
  })
}
