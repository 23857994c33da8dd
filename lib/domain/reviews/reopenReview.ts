import { setReviewFinished } from '@/db/queries/assignmentsRead'
import { authorize } from '@/lib/auth/authorize'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { canReopenReview } from './policy'
import { reviewFacts } from './reviewFacts'
import type { ReviewKeyInput } from './schema'
import { staleReview } from './staleReview'

/** Opens a finished review again; possible until reviews are due. */
export function reopenReview(ctx: ActingContext, input: ReviewKeyInput): Promise<{ version: number }> {
  return inTransaction(ctx, async (tx) => {
    const facts = await reviewFacts(tx, input.assignmentId, true)
    authorize(canReopenReview(tx.actor, facts))
    if (!(await setReviewFinished(tx.db, input.assignmentId, input.version, false)))
      throw staleReview(facts.assignment.version, facts.now)
    await writeLogbook(tx, {
      action: 'reopenReview',
      actingAs: 'reviewer',
      subject: { kind: 'assignment', id: input.assignmentId },
      before: { finished: true },
      after: { finished: false },
    })
    return { version: input.version + 1 }
  })
}
