import type { z } from 'zod'
import { databaseNow } from '@/db/queries/clock'
import { insertInvitation, isInvitedAlready } from '@/db/queries/invitations'
import { findPersonByEmail } from '@/db/queries/people'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { paths } from '@/lib/paths'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { invitationLetter } from '../outbox/letters/invitation'
import { queueLetter } from '../outbox/queueLetter'
import { findScope } from '../roles/findScope'
import { grantRole } from '../roles/grantRole'
import { mailedToken } from '../sessions/mailedToken'
import { mayInvite } from './policy'
import { roleWords } from './roleWords'
import type { inviteSchema } from './schema'

const lifeDays = 21

export interface Invited {
  /** `granted`: the address has an account, and the role was given to it at once. */
  outcome: 'invited' | 'granted'
  /** What happened, for whoever invited. */
  sentence: string
}

/** Invites a person to a role by letter; where the address has an account, the account gets the role instead. */
export async function invite(ctx: ActingContext, input: z.output<typeof inviteSchema>): Promise<Invited> {
  authorize(mayInvite(ctx.actor))
  const account = await findPersonByEmail(ctx.db, input.email)
  if (account?.disabled_at)
    throw refuse.field('email', 'This address has an account that is shut. Open it again first.')
  if (account?.email_confirmed_at) {
    await grantRole(ctx, { ...input, personId: account.id, fromAt: '' })
    return {
      outcome: 'granted',
      sentence: `${input.email} has an account, of ${account.name}. It has the role from now on, and a letter says so.`,
    }
  }
  return inTransaction(ctx, async (tx) => {
    const { where, ...scope } = await findScope(tx.db, input)
    const wanted = { email: input.email, role: input.role, ...scope }
    if (await isInvitedAlready(tx.db, wanted))
      throw refuse.field('email', 'An invitation to this role is on its way to this address already.')
    const roleUntilAt = input.untilAt ? new Date(input.untilAt) : null
    if (roleUntilAt && roleUntilAt <= (await databaseNow(tx.db)))
      throw refuse.field('untilAt', 'This moment has passed already.')
    const { token, hash } = mailedToken(tx.random)
    const id = await insertInvitation(tx.db, {
      ...wanted,
      tokenHash: hash,
      name: input.name,
      invitedBy: tx.actor.personId,
      lifeDays,
      roleUntilAt,
    })
    const link = tx.request.origin + paths.invitation(token)
    await queueLetter(
      tx,
      { personId: null, email: input.email, name: input.name },
      invitationLetter(input, roleWords[input.role], where, tx.actor.name, link),
      `invitation:${id}`,
    )
    await writeLogbook(tx, {
      action: 'invite',
      subject: { kind: 'invitation', id },
      actingAs: 'office',
      after: { role: input.role, panelId: scope.panelId, instrumentId: scope.instrumentId },
    })
    return { outcome: 'invited', sentence: `Invitation on its way to ${input.email}` }
  })
}
