import { findPerson, setPassword } from '@/db/queries/people'
import { endSessionsOf } from '@/db/queries/sessions'
import { refuse } from '@/lib/errors'
import { paths } from '@/lib/paths'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { passwordChanged } from '../outbox/letters/passwordChanged'
import { queueLetter } from '../outbox/queueLetter'
import { secretHash } from '../sessions/secretHash'
import { hashPassword, passwordMatches } from './password'

/** Changes the own password; every other browser is signed out. */
export async function changePassword(
  ctx: ActingContext,
  input: { current: string; password: string; sessionId: string | null },
): Promise<void> {
  const person = await findPerson(ctx.db, ctx.actor.personId)
  if (!person || !(await passwordMatches(person.password_hash, input.current)))
    throw refuse.field('current', 'This is not your present password.')
  const passwordHash = await hashPassword(input.password)
  await inTransaction(ctx, async (tx) => {
    await setPassword(tx.db, person.id, passwordHash)
    await endSessionsOf(tx.db, person.id, input.sessionId ? secretHash(input.sessionId) : null)
    const letter = passwordChanged(person, tx.request.origin + paths.forgotPassword())
    const addressee = { personId: person.id, email: person.email, name: person.name }
    await queueLetter(tx, addressee, letter, `password:${tx.request.id}`)
    await writeLogbook(tx, {
      action: 'change-password',
      subject: { kind: 'person', id: person.id },
      actingAs: 'investigator',
    })
  })
}
