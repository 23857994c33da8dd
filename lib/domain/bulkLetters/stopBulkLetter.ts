import { stopBulkLetter as stopRows } from '@/db/queries/bulkLetters'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { mayWriteToMany } from './policy'

/** Stops the letters of one letter to many that have not been sent. Returns how many. */
export async function stopBulkLetter(
  ctx: ActingContext,
  input: { id: number },
): Promise<{ stopped: number }> {
  authorize(mayWriteToMany(ctx.actor))
  return inTransaction(ctx, async (tx) => {
    const stopped = await stopRows(tx.db, input.id)
    if (stopped === 0) throw refuse.closed('Nothing of it waits any more.')
    await writeLogbook(tx, {
      action: 'bulk-letter.stop',
      subject: { kind: 'bulk letter', id: input.id },
      actingAs: 'office',
      after: { stopped },
    })
    return { stopped }
  })
}
