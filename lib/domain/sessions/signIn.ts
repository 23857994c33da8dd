import { findPersonByEmail, grantsInForce } from '@/db/queries/people'
import { insertSession } from '@/db/queries/sessions'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { passwordMatches } from '../people/password'
import { sessionLimits } from './rules'
import { secretHash } from './secretHash'

export interface SignedIn {
  sessionId: string
  personId: number
  name: string
  email: string
}

const wrong = () => refuse.field('password', 'This address and password do not go together.')

/** Checks address and password and opens a session; the same answer whether or not the account exists. */
export async function signIn(ctx: Context, input: { email: string; password: string }): Promise<SignedIn> {
  const person = await findPersonByEmail(ctx.db, input.email)
  const matches = await passwordMatches(person?.password_hash ?? null, input.password)
  if (!person || !matches) throw wrong()
  if (person.disabled_at) throw refuse.forbidden('This account has been shut. Write to the office.')
  if (!person.email_confirmed_at)
    throw refuse.forbidden(
      'Open the link we sent to this address first; it proves that the address is yours.',
    )

  const sessionId = Buffer.from(ctx.random.bytes(32)).toString('base64url')
  await inTransaction(ctx, async (tx) => {
    const roles = (await grantsInForce(tx.db, person.id)).map((grant) => grant.role)
    await insertSession(tx.db, {
      idHash: secretHash(sessionId),
      personId: person.id,
      lifeSeconds: sessionLimits(roles).lifeSeconds,
      userAgent: tx.request.userAgent,
    })
    const actor = {
      personId: person.id,
      name: person.name,
      email: person.email,
      timeZone: person.time_zone,
      grants: [],
    }
    await writeLogbook(
      { ...tx, actor },
      { action: 'sign-in', subject: { kind: 'person', id: person.id }, actingAs: 'visitor' },
    )
  })
  return { sessionId, personId: person.id, name: person.name, email: person.email }
}
