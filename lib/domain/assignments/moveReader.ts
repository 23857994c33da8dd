import { giveAssignment, panelAssignments, takeAssignmentBack } from '@/db/queries/assignments'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openPanel } from '../panels/openPanel'
import { demandPairs } from './demandPairs'
import type { MoveInput } from './schema'
import { writeToReviewers } from './writeToReviewers'

/** Gives a reader another proposal in place of one, both or neither; what was scored on the first stays on record. */
export function moveReader(ctx: ActingContext, input: MoveInput): Promise<{ assignmentId: number }> {
  return inTransaction(ctx, async (tx) => {
    const desk = await openPanel(tx, { panelId: input.panelId, lock: true })
    const standing = await panelAssignments(tx.db, desk.panel.id)
    const left = standing.find((a) => a.id === input.assignmentId)
    if (!left || !desk.proposals.some(({ id }) => id === left.proposalId)) throw refuse.notFound('assignment')
    const pair = { proposalId: input.proposalId, personId: left.personId }
    const members = await demandPairs(tx, desk, [pair], () => 'proposalId')
    if (standing.some((a) => a.proposalId === pair.proposalId && a.personId === pair.personId))
      throw refuse.field('proposalId', 'This reviewer reads it already.')
    if (!(await takeAssignmentBack(tx.db, left.id, 'moved by the chair')))
      throw refuse.closed('This review is finished: it counts, and stays.')
    const { id: assignmentId, isUndo } = await giveAssignment(tx.db, {
      ...pair,
      panelId: desk.panel.id,
      seat: input.seat,
      by: tx.actor.personId,
    })
    if (!isUndo) await writeToReviewers(tx, desk, members, [pair], false)
    await writeLogbook(tx, {
      action: 'panel.move',
      subject: { kind: 'assignment', id: left.id },
      actingAs: 'chair',
      before: { proposalId: left.proposalId, seat: left.seat },
      after: { proposalId: input.proposalId, seat: input.seat, assignmentId },
    })
    return { assignmentId }
  })
}
