import { mergeRows } from '@/db/queries/merge'
import { findPerson, lockPerson } from '@/db/queries/people'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { isDuplicate } from '../isDuplicate'
import { writeLogbook } from '../logbook/writeLogbook'
import { mayManagePeopleOfOffice } from './policy'
import { whyNotMerge } from './whyNotMerge'

/**
 * Makes one account of two: all that belongs to one moves to the other in one transaction, and the empty one is shut.
 * The logbook is not touched: it keeps who acted with which account. Returns how many rows moved.
 */
export async function mergePeople(
  ctx: ActingContext,
  input: { keepId: number; goneId: number },
): Promise<{ moved: number }> {
  authorize(mayManagePeopleOfOffice(ctx.actor))
  return inTransaction(ctx, async (tx) => {
    for (const id of [input.keepId, input.goneId].sort((a, b) => a - b)) await lockPerson(tx.db, id)
    const [keep, gone] = [await findPerson(tx.db, input.keepId), await findPerson(tx.db, input.goneId)]
    if (!keep || !gone) throw refuse.notFound('account')
    const [why] = await whyNotMerge(tx.db, keep, gone, tx.actor.personId)
    if (why) throw refuse.closed(why)
    const moved = await mergeRows(tx.db, keep, gone).catch((error: unknown) => {
      if (isDuplicate(error))
        throw refuse.closed('Both have something of which one person can have only one. Nothing was moved.')
      throw error
    })
    await writeLogbook(tx, {
      action: 'person.merge',
      subject: { kind: 'person', id: keep.id },
      actingAs: 'office',
      before: { gone: gone.id, email: gone.email },
      after: { moved },
    })
    return { moved }
  })
}
