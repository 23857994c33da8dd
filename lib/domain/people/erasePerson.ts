import { erasePersonRows, inTheWayOfErasure, keptAfterErasure, mergedInto } from '@/db/queries/erasure'
import { findPerson, lockPerson } from '@/db/queries/people'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { personErased } from '../outbox/letters/personErased'
import { queueLetter } from '../outbox/queueLetter'
import { wayWords, whatStays } from './erasureWords'
import { mayErase } from './policy'

/**
 * Blanks what speaks of a person; what must be kept stays under no name. It cannot be taken back. They are told by one
 * letter, to the address as it was.
 */
export async function erasePerson(ctx: ActingContext, input: { personId: number }): Promise<void> {
  authorize(mayErase(ctx.actor, input.personId))
  await inTransaction(ctx, async (tx) => {
    await lockPerson(tx.db, input.personId)
    const person = await findPerson(tx.db, input.personId)
    if (!person) throw refuse.notFound('account')
    if (person.erased_at) throw refuse.closed('This person was erased already.')
    const [first] = wayWords(await inTheWayOfErasure(tx.db, person.id))
    if (first) throw refuse.closed(first)
    const kept = await keptAfterErasure(tx.db, person.id)
    // Accounts that were merged into this one still hold a name and an address.
    for (const one of [person, ...(await mergedInto(tx.db, person.id))])
      await erasePersonRows(tx.db, one.id, one.email)
    // After all is blanked: the one letter that still has the address, and loses it when it goes.
    const stays = whatStays(kept).map(({ what, why }) => `${what}. ${why}`)
    await queueLetter(
      tx,
      { personId: null, email: person.email, name: person.name },
      personErased({ name: person.name, stays }),
      `erased:${person.id}`,
    )
    await writeLogbook(tx, {
      action: 'person.erase',
      subject: { kind: 'person', id: person.id },
      actingAs: 'office',
      after: { kept },
    })
  })
}
