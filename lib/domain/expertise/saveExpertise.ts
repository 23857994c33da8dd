import { replaceExpertise } from '@/db/queries/expertise'
import { lockPerson } from '@/db/queries/people'
import { authorize } from '@/lib/auth/authorize'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { mayStateExpertise } from './policy'
import type { ExpertiseInput } from './schema'

/** Keeps what a reviewer says they know, in place of what they said before. */
export async function saveExpertise(ctx: ActingContext, input: ExpertiseInput): Promise<void> {
  authorize(mayStateExpertise(ctx.actor))
  return inTransaction(ctx, async (tx) => {
    const { personId } = tx.actor
    await lockPerson(tx.db, personId)
    await replaceExpertise(tx.db, { personId, ...input })
    await writeLogbook(tx, {
      action: 'saveExpertise',
      subject: { kind: 'person', id: personId },
      actingAs: 'reviewer',
      after: { categories: input.levels.size, words: input.words.length },
    })
  })
}
