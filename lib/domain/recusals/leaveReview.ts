import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { callPhase } from '../calls/rules'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { canOpenReview } from '../reviews/policy'
import { reviewFacts } from '../reviews/reviewFacts'
import { recuse } from './recuse'
import type { LeaveReviewInput } from './schema'

/** A reviewer finds an interest while reading: the review is withdrawn, whatever was scored and written. */
export function leaveReview(ctx: ActingContext, input: LeaveReviewInput): Promise<void> {
  return inTransaction(ctx, async (tx) => {
    const facts = await reviewFacts(tx, input.assignmentId, true)
    authorize(canOpenReview(tx.actor, facts))
    if (callPhase(facts.call, facts.now) === 'decided')
      throw refuse.closed('The decisions of this call are made known. Write to the office instead.')
    const { assignment, call } = facts
    await recuse(tx, call, { ...input, proposalId: assignment.proposalId })
    await writeLogbook(tx, {
      action: 'leaveReview',
      subject: { kind: 'assignment', id: assignment.id },
      actingAs: 'reviewer',
      before: { finished: assignment.finishedAt !== null },
      after: { kind: input.kind, reason: input.reason },
    })
  })
}
