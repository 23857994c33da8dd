import { findOpenInvitation } from '@/db/queries/invitations'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { secretHash } from '../sessions/secretHash'
import { grantInvited } from './grantInvited'

/** Accepts an invitation with the account one is signed in with; it must be the address invited. */
export async function acceptAsSelf(ctx: ActingContext, input: { token: string }): Promise<void> {
  await inTransaction(ctx, async (tx) => {
    const invitation = await findOpenInvitation(tx.db, secretHash(input.token))
    if (!invitation) throw refuse.closed('This invitation has been accepted, withdrawn or is too old.')
    if (invitation.email.toLowerCase() !== tx.actor.email.toLowerCase())
      throw refuse.forbidden(
        'This invitation was sent to another address than the one you are signed in with.',
      )
    await grantInvited(tx, invitation, tx.actor.personId)
  })
}
