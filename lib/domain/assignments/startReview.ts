import { moveStage, putUnderReview } from '@/db/queries/assignments'
import { findCall } from '@/db/queries/calls'
import { databaseNow } from '@/db/queries/clock'
import { lastOwnDeadline } from '@/db/queries/ownDeadline'
import { seatsHeld } from '@/db/queries/panel'
import { refuse } from '@/lib/errors'
import { formatUtcInstant } from '@/lib/format'
import { holds } from '../actor'
import { callPhase } from '../calls/rules'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { canLeadPanel } from '../panels/policy'
import { whyNotStartReview } from '../panels/stages'

/** Starts the review of a closed call: every proposal sent goes under review. For the office, or whoever leads a panel. */
export function startReview(ctx: ActingContext, input: { callId: number }): Promise<void> {
  return inTransaction(ctx, async (tx) => {
    const call = await findCall(tx.db, input.callId)
    if (!call) throw refuse.notFound('call')
    const isOffice = holds(tx.actor, 'office')
    const leads = (await seatsHeld(tx.db, call.id, tx.actor.personId)).some(
      (panel) => canLeadPanel(tx.actor, { ...panel, callId: call.id }).allowed,
    )
    if (!isOffice && !leads) throw refuse.notFound('call')
    const why = whyNotStartReview(callPhase(call, await databaseNow(tx.db)))
    if (why) throw refuse.closed(why)
    const until = await lastOwnDeadline(tx.db, call.id)
    if (until)
      throw refuse.closed(
        `A proposal may still be sent until ${formatUtcInstant(until)}. The review starts after that.`,
      )
    if (!(await moveStage(tx.db, call.id, 'published', 'review')))
      throw refuse.closed('The review of this call has started already.')
    const proposals = await putUnderReview(tx.db, call.id)
    await writeLogbook(tx, {
      action: 'call.start-review',
      subject: { kind: 'call', id: call.id },
      actingAs: leads && !isOffice ? 'chair' : 'office',
      before: { stage: 'published' },
      after: { stage: 'review', proposals },
    })
  })
}
