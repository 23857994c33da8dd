import type { z } from 'zod'
import { findOpenInvitation } from '@/db/queries/invitations'
import { confirmEmail, findPersonByEmail, insertGrant, insertPerson, setPassword } from '@/db/queries/people'
import { refuse } from '@/lib/errors'
import { paths } from '@/lib/paths'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { hashPassword } from '../people/password'
import { sortName } from '../people/sortName'
import { secretHash } from '../sessions/secretHash'
import { grantInvited } from './grantInvited'
import type { acceptInvitationSchema } from './schema'

/**
 * Accepts an invitation with a new account; the mailed link proves the address. An account that was begun with the
 * address and never proved becomes this one, with this password. Gives the page that waits for the new member.
 */
export async function acceptInvitation(
  ctx: Context,
  input: z.output<typeof acceptInvitationSchema>,
): Promise<{ email: string; next: string | null }> {
  const passwordHash = await hashPassword(input.password)
  return inTransaction(ctx, async (tx) => {
    const invitation = await findOpenInvitation(tx.db, secretHash(input.token))
    if (!invitation) throw refuse.closed('This invitation has been accepted, withdrawn or is too old.')
    const begun = await findPersonByEmail(tx.db, invitation.email)
    if (begun?.email_confirmed_at || begun?.disabled_at)
      throw refuse.closed('This address has an account. Sign in with it, then open the link again.')
    if (begun) await setPassword(tx.db, begun.id, passwordHash)
    const personId =
      begun?.id ??
      (await insertPerson(tx.db, {
        email: invitation.email,
        name: input.name,
        sortName: sortName(input.name),
        institute: input.institute,
        passwordHash,
      }))
    await confirmEmail(tx.db, personId)
    await insertGrant(tx.db, { personId, role: 'investigator' })
    await grantInvited(tx, invitation, personId)
    const { proposal_reference: reference } = invitation
    return {
      email: invitation.email,
      next: reference ? paths.proposalSection(reference, 'people') : null,
    }
  })
}
