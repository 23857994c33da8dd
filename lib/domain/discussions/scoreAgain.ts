import { callCriteria } from '@/db/queries/calls'
import { tableOfPanel } from '@/db/queries/discussion'
import { lockPanel } from '@/db/queries/panel'
import { insertScoreEvent, standingScores } from '@/db/queries/reviews'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { canOpenReview } from '../reviews/policy'
import { reviewFacts } from '../reviews/reviewFacts'
import type { SaveScoreInput } from '../reviews/schema'
import { whyNotScoredAgain } from './rules'

/**
 * A reader scores again while the proposal is on the table. The first score stays what it was: this one is an event of
 * its own round, and null takes it back. Merit and the raw mean never use it.
 */
export function scoreAgain(
  ctx: ActingContext,
  input: SaveScoreInput,
): Promise<{ halfPoints: number | null }> {
  return inTransaction(ctx, async (tx) => {
    const first = await reviewFacts(tx, input.assignmentId, false)
    authorize(canOpenReview(tx.actor, first))
    // The table is looked at behind the panel's lock: the chair may be clearing it.
    await lockPanel(tx.db, first.assignment.panelId)
    const facts = await reviewFacts(tx, input.assignmentId, true)
    authorize(canOpenReview(tx.actor, facts))
    const table = await tableOfPanel(tx.db, facts.assignment.panelId)
    const why = whyNotScoredAgain(
      table.proposalId === facts.assignment.proposalId,
      facts.assignment.finishedAt !== null,
    )
    if (why) throw refuse.closed(why)
    const criterion = (await callCriteria(tx.db, facts.call.id)).find(({ id }) => id === input.criterionId)
    if (!criterion) throw refuse.notFound('criterion')
    const scores = await standingScores(tx.db, [input.assignmentId], 'after-discussion')
    const stands = scores.get(input.assignmentId)?.get(criterion.id) ?? null
    if (stands === input.halfPoints) return { halfPoints: stands }
    await insertScoreEvent(tx.db, {
      assignmentId: input.assignmentId,
      criterionId: criterion.id,
      criterionVersion: criterion.criterionVersion,
      halfPoints: input.halfPoints,
      round: 'after-discussion',
    })
    await writeLogbook(tx, {
      action: 'scoreAgain',
      actingAs: 'reviewer',
      subject: { kind: 'assignment', id: input.assignmentId },
      after: { criterion: criterion.position, scored: input.halfPoints !== null },
    })
    return { halfPoints: input.halfPoints }
  })
}
