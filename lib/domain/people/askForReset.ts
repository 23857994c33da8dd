import { insertEmailToken } from '@/db/queries/emailTokens'
import { findPersonByEmail } from '@/db/queries/people'
import { paths } from '@/lib/paths'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { resetPasswordLetter } from '../outbox/letters/resetPassword'
import { queueLetter } from '../outbox/queueLetter'
import { mailedToken } from '../sessions/mailedToken'

/** Mails a link to choose a new password. The answer is the same for an address we do not know. */
export async function askForReset(ctx: Context, input: { email: string }): Promise<{ email: string }> {
  await inTransaction(ctx, async (tx) => {
    const person = await findPersonByEmail(tx.db, input.email)
    if (!person || person.disabled_at) return
    const { token, hash } = mailedToken(tx.random)
    const tokenId = await insertEmailToken(tx.db, {
      personId: person.id,
      purpose: 'reset',
      hash,
      lifeMinutes: 10,
    })
    const letter = resetPasswordLetter(person, tx.request.origin + paths.resetPassword(token))
    await queueLetter(
      tx,
      { personId: person.id, email: person.email, name: person.name },
      letter,
      `reset:${tokenId}`,
    )
  })
  return { email: input.email }
}
