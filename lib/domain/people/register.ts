import type { z } from 'zod'
import { insertEmailToken } from '@/db/queries/emailTokens'
import { findPersonByEmail, insertPerson, setPassword } from '@/db/queries/people'
import { paths } from '@/lib/paths'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { accountExists } from '../outbox/letters/accountExists'
import { confirmAddress } from '../outbox/letters/confirmAddress'
import { queueLetter } from '../outbox/queueLetter'
import { mailedToken } from '../sessions/mailedToken'
import { hashPassword } from './password'
import type { registerSchema } from './schema'
import { sortName } from './sortName'

const twoDays = 2 * 24 * 60

/** Opens an account, to be confirmed by letter. An address that has one gets a letter too: the answer tells nobody which. */
export async function register(
  ctx: Context,
  input: z.output<typeof registerSchema>,
): Promise<{ email: string }> {
  // Hashed before anything is looked up, so that both answers take the same time.
  const passwordHash = await hashPassword(input.password)
  return inTransaction(ctx, async (tx) => {
    const existing = await findPersonByEmail(tx.db, input.email)
    const { token, hash } = mailedToken(tx.random)
    if (existing?.email_confirmed_at) {
      const letter = accountExists(existing, tx.request.origin + paths.forgotPassword())
      await queueLetter(
        tx,
        { personId: existing.id, email: existing.email, name: existing.name },
        letter,
        `exists:${hash.slice(0, 32)}`,
      )
      return { email: input.email }
    }
    // Two registrations of one address: neither password can be trusted, so the link will ask for a new one.
    if (existing) await setPassword(tx.db, existing.id, null)
    const personId =
      existing?.id ?? (await insertPerson(tx.db, { ...input, sortName: sortName(input.name), passwordHash }))
    const tokenId = await insertEmailToken(tx.db, {
      personId,
      purpose: 'confirm',
      hash,
      lifeMinutes: twoDays,
    })
    await queueLetter(
      tx,
      { personId, email: input.email, name: input.name },
      confirmAddress(input, tx.request.origin + paths.confirm(token)),
      `confirm:${tokenId}`,
    )
    if (!existing)
      await writeLogbook(tx, {
        action: 'register',
        subject: { kind: 'person', id: personId },
        actingAs: 'visitor',
      })
    return { email: input.email }
  })
}
