import { findEmailToken, useEmailTokens } from '@/db/queries/emailTokens'
import { confirmEmail, findPerson, insertGrant, setPassword } from '@/db/queries/people'
import { endSessionsOf } from '@/db/queries/sessions'
import { refuse } from '@/lib/errors'
import { paths } from '@/lib/paths'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { passwordChanged } from '../outbox/letters/passwordChanged'
import { queueLetter } from '../outbox/queueLetter'
import { secretHash } from '../sessions/secretHash'
import { hashPassword } from './password'

/** Sets a new password by the mailed link and signs out every browser. The link also proves the address. */
export async function resetPassword(ctx: Context, input: { token: string; password: string }): Promise<void> {
  const passwordHash = await hashPassword(input.password)
  await inTransaction(ctx, async (tx) => {
    const found = await findEmailToken(tx.db, secretHash(input.token), 'reset')
    const person = found && (await findPerson(tx.db, found.personId))
    if (!found || !person)
      throw refuse.closed('This link has been used or is older than ten minutes. Ask for a new one.')
    await useEmailTokens(tx.db, person.id, 'reset')
    await setPassword(tx.db, person.id, passwordHash)
    if (await confirmEmail(tx.db, person.id))
      await insertGrant(tx.db, { personId: person.id, role: 'investigator' })
    await endSessionsOf(tx.db, person.id, null)
    const letter = passwordChanged(person, tx.request.origin + paths.forgotPassword())
    await queueLetter(
      tx,
      { personId: person.id, email: person.email, name: person.name },
      letter,
      `password:${found.id}`,
    )
    await writeLogbook(tx, {
      action: 'reset-password',
      subject: { kind: 'person', id: person.id },
      actingAs: 'visitor',
    })
  })
}
