import { setReviewFinished } from '@/db/queries/assignmentsRead'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { canWriteReview } from './policy'
import { readSheet } from './readSheet'
import { reviewFacts } from './reviewFacts'
import { reviewGaps } from './rules'
import type { ReviewKeyInput } from './schema'
import { staleReview } from './staleReview'

/** Finishes a review: every criterion scored, and something for the investigators to read. */
export function finishReview(ctx: ActingContext, input: ReviewKeyInput): Promise<{ version: number }> {
  return inTransaction(ctx, async (tx) => {
    const facts = await reviewFacts(tx, input.assignmentId, true)
    authorize(canWriteReview(tx.actor, facts))
    const sheet = await readSheet(tx.db, facts.call.id, input.assignmentId)
    const toInvestigators = sheet.texts.find(({ audience }) => audience === 'investigators')?.body ?? ''
    const gaps = reviewGaps(sheet.criteria, toInvestigators)
    if (Object.keys(gaps).length > 0) throw refuse.invalid('The review is not whole yet.', gaps)
    if (!(await setReviewFinished(tx.db, input.assignmentId, input.version, true)))
      throw staleReview(facts.assignment.version, facts.now)
    await writeLogbook(tx, {
      action: 'finishReview',
      actingAs: 'reviewer',
      subject: { kind: 'assignment', id: input.assignmentId },
      before: { finished: false },
      after: { finished: true },
    })
    return { version: input.version + 1 }
  })
}
