import { reviewTexts, writeReviewText } from '@/db/queries/reviews'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { canWriteReview } from './policy'
import { reviewFacts } from './reviewFacts'
import type { SaveReviewTextInput } from './schema'

/** Stores a text of the sheet if no other window stored it since; returns the version it has now. */
export function saveReviewText(ctx: ActingContext, input: SaveReviewTextInput): Promise<{ version: number }> {
  return inTransaction(ctx, async (tx) => {
    authorize(canWriteReview(tx.actor, await reviewFacts(tx, input.assignmentId, true)))
    if (!(await writeReviewText(tx.db, input))) {
      const theirs = (await reviewTexts(tx.db, input.assignmentId)).find(
        ({ audience }) => audience === input.audience,
      )
      throw refuse.stale({
        changedBy: 'You, in another window,',
        changedAt: (theirs?.savedAt ?? new Date(0)).toISOString(),
        version: theirs?.version ?? 0,
        theirs: { body: theirs?.body ?? '' },
      })
    }
    await writeLogbook(tx, {
      action: 'saveReviewText',
      actingAs: 'reviewer',
      subject: { kind: 'assignment', id: input.assignmentId },
      after: { audience: input.audience, version: input.version + 1 },
    })
    return { version: input.version + 1 }
  })
}
