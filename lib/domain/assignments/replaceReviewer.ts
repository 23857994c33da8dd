import { giveAssignment, panelAssignments, takeAssignmentBack } from '@/db/queries/assignments'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openPanel } from '../panels/openPanel'
import { demandPairs } from './demandPairs'
import type { ReplaceInput } from './schema'
import { writeToReviewers } from './writeToReviewers'

/** Someone cannot go on: another takes the same seat at once, and is written to. */
export function replaceReviewer(ctx: ActingContext, input: ReplaceInput): Promise<{ assignmentId: number }> {
  return inTransaction(ctx, async (tx) => {
    const desk = await openPanel(tx, { panelId: input.panelId, lock: true })
    const standing = await panelAssignments(tx.db, desk.panel.id)
    const left = standing.find((a) => a.id === input.assignmentId)
    if (!left || !desk.proposals.some(({ id }) => id === left.proposalId)) throw refuse.notFound('assignment')
    if (left.finishedAt) throw refuse.closed('This review is finished: it counts, and stays.')
    const pair = { proposalId: left.proposalId, personId: input.personId }
    const members = await demandPairs(tx, desk, [pair], () => 'personId')
    if (standing.some((a) => a.proposalId === pair.proposalId && a.personId === pair.personId))
      throw refuse.field('personId', 'This reviewer reads it already.')
    await takeAssignmentBack(tx.db, left.id, input.reason)
    const { id: assignmentId } = await giveAssignment(tx.db, {
      ...pair,
      panelId: desk.panel.id,
      seat: left.seat,
      by: tx.actor.personId,
    })
    await writeToReviewers(tx, desk, members, [pair], true)
    await writeLogbook(tx, {
      action: 'panel.replace',
      subject: { kind: 'assignment', id: left.id },
      actingAs: 'chair',
      before: { personId: left.personId },
      after: { personId: input.personId, assignmentId, reason: input.reason },
    })
    return { assignmentId }
  })
}
