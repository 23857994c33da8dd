import { callCriteria } from '@/db/queries/calls'
import { insertScoreEvent, standingScores } from '@/db/queries/reviews'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { canWriteReview } from './policy'
import { reviewFacts } from './reviewFacts'
import type { SaveScoreInput } from './schema'

/** Adds a score to the sheet as a new event; the same score again adds nothing. Earlier events stay. */
export function saveScore(ctx: ActingContext, input: SaveScoreInput): Promise<{ halfPoints: number | null }> {
  return inTransaction(ctx, async (tx) => {
    const facts = await reviewFacts(tx, input.assignmentId, true)
    authorize(canWriteReview(tx.actor, facts))
    const criterion = (await callCriteria(tx.db, facts.call.id)).find(({ id }) => id === input.criterionId)
    if (!criterion) throw refuse.notFound('criterion')
    const scores = await standingScores(tx.db, [input.assignmentId])
    const stands = scores.get(input.assignmentId)?.get(criterion.id) ?? null
    if (stands === input.halfPoints) return { halfPoints: stands }
    await insertScoreEvent(tx.db, {
      assignmentId: input.assignmentId,
      criterionId: criterion.id,
      criterionVersion: criterion.criterionVersion,
      halfPoints: input.halfPoints,
    })
    // The score itself stands in its event; the logbook is read by people who must not see it.
    await writeLogbook(tx, {
      action: 'saveScore',
      actingAs: 'reviewer',
      subject: { kind: 'assignment', id: input.assignmentId },
      after: { criterion: criterion.position, scored: input.halfPoints !== null },
    })
    return { halfPoints: input.halfPoints }
  })
}
