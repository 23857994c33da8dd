import { requeueLetter } from '@/db/queries/outbox'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { mayReadOutbox } from './policy'

/** Sends a letter that waits, was set aside or came back at the next turn of the relay. */
export async function retryLetter(ctx: ActingContext, input: { letterId: number }): Promise<void> {
  authorize(mayReadOutbox(ctx.actor))
  await inTransaction(ctx, async (tx) => {
    if (!(await requeueLetter(tx.db, input.letterId)))
      throw refuse.closed('This letter has been sent or stopped already.')
    await writeLogbook(tx, {
      action: 'letter.retry',
      subject: { kind: 'letter', id: input.letterId },
      actingAs: 'office',
    })
  })
}
