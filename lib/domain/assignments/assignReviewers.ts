import { giveAssignment, panelAssignments } from '@/db/queries/assignments'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openPanel } from '../panels/openPanel'
import { demandPairs } from './demandPairs'
import type { AssignInput } from './schema'
import { writeToReviewers } from './writeToReviewers'

/** Gives proposals to reviewers, all or none; each reviewer gets one letter, none for an undo. Pairs that stand already stay. */
export function assignReviewers(
  ctx: ActingContext,
  input: AssignInput,
): Promise<{ assignmentIds: number[] }> {
  return inTransaction(ctx, async (tx) => {
    const desk = await openPanel(tx, { panelId: input.panelId, lock: true })
    const members = await demandPairs(tx, desk, input.pairs, () => 'pairs')
    const standing = await panelAssignments(tx.db, desk.panel.id)
    const fresh = input.pairs.filter(
      (pair) => !standing.some((a) => a.proposalId === pair.proposalId && a.personId === pair.personId),
    )
    const assignmentIds: number[] = []
    const news: typeof fresh = []
    for (const pair of fresh) {
      const by = tx.actor.personId
      const { id, isUndo } = await giveAssignment(tx.db, { ...pair, panelId: desk.panel.id, by })
      assignmentIds.push(id)
      if (!isUndo) news.push(pair)
    }
    if (fresh.length === 0) return { assignmentIds }
    await writeToReviewers(tx, desk, members, news, false)
    await writeLogbook(tx, {
      action: 'panel.assign',
      subject: { kind: 'panel', id: desk.panel.id },
      actingAs: 'chair',
      after: fresh,
    })
    return { assignmentIds }
  })
}
