import { findEmailToken, insertEmailToken, useEmailTokens } from '@/db/queries/emailTokens'
import { confirmEmail, findPerson, insertGrant } from '@/db/queries/people'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { mailedToken } from '../sessions/mailedToken'
import { secretHash } from '../sessions/secretHash'

/**
 * Proves an address by the mailed link; from then on its owner may sign in and write proposals. Gives a token to
 * choose a password where there is none to trust.
 */
export async function confirmAddress(
  ctx: Context,
  input: { token: string },
): Promise<{ resetToken: string | null }> {
  return inTransaction(ctx, async (tx) => {
    const found = await findEmailToken(tx.db, secretHash(input.token), 'confirm')
    if (!found)
      throw refuse.closed('This link has been used or is too old. Register again and we send a new one.')
    await useEmailTokens(tx.db, found.personId, 'confirm')
    if (await confirmEmail(tx.db, found.personId))
      await insertGrant(tx.db, { personId: found.personId, role: 'investigator' })
    await writeLogbook(tx, {
      action: 'confirm-address',
      subject: { kind: 'person', id: found.personId },
      actingAs: 'visitor',
    })
    const person = await findPerson(tx.db, found.personId)
    if (person?.password_hash) return { resetToken: null }
    const { token, hash } = mailedToken(tx.random)
    await insertEmailToken(tx.db, { personId: found.personId, purpose: 'reset', hash, lifeMinutes: 10 })
    return { resetToken: token }
  })
}
