import { setErasureAsked } from '@/db/queries/erasure'
import { officePeople } from '@/db/queries/roleHolders'
import { refuse } from '@/lib/errors'
import { paths } from '@/lib/paths'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { erasureAsked } from '../outbox/letters/erasureAsked'
import { queueLetter } from '../outbox/queueLetter'

/** Asks the office to erase the own account, or takes that back; the office is told by letter. */
export async function askForErasure(ctx: ActingContext, input: { isAsked: boolean }): Promise<void> {
  await inTransaction(ctx, async (tx) => {
    const { personId, name } = tx.actor
    if (!(await setErasureAsked(tx.db, personId, input.isAsked)))
      throw refuse.closed(input.isAsked ? 'You have asked already.' : 'You have not asked.')
    const url = tx.request.origin + paths.officePerson(personId)
    if (input.isAsked)
      for (const clerk of await officePeople(tx.db))
        await queueLetter(
          tx,
          clerk,
          erasureAsked({ name: clerk.name, asks: name, url }),
          `erasure-asked:${personId}:${tx.request.id}`,
        )
    await writeLogbook(tx, {
      action: input.isAsked ? 'person.ask-erasure' : 'person.keep',
      subject: { kind: 'person', id: personId },
      actingAs: 'investigator',
    })
  })
}
