import { endSessionsOf } from '@/db/queries/sessions'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { secretHash } from './secretHash'

/** Signs out every browser of the actor but the one that asks; returns how many. */
export async function endOtherSessions(
  ctx: ActingContext,
  keepSessionId: string | null,
): Promise<{ ended: number }> {
  return inTransaction(ctx, async (tx) => {
    const ended = await endSessionsOf(
      tx.db,
      tx.actor.personId,
      keepSessionId ? secretHash(keepSessionId) : null,
    )
    await writeLogbook(tx, {
      action: 'end-other-sessions',
      subject: { kind: 'person', id: tx.actor.personId },
      actingAs: 'investigator',
      after: { ended },
    })
    return { ended }
  })
}
