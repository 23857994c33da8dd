import { panelAssignments, takeAssignmentBack } from '@/db/queries/assignments'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openPanel } from '../panels/openPanel'
import type { TakeOffInput } from './schema'

/** Takes assignments back; what was scored and written stays on record. A finished review counts and stays. */
export function takeOff(ctx: ActingContext, input: TakeOffInput): Promise<{ taken: number }> {
  return inTransaction(ctx, async (tx) => {
    const desk = await openPanel(tx, { panelId: input.panelId, lock: true })
    if (desk.phase !== 'closed' && desk.phase !== 'review')
      throw refuse.closed('The panel has begun its ranking: assignments stay as they are.')
    const visible = new Set(desk.proposals.map(({ id }) => id))
    const standing = (await panelAssignments(tx.db, desk.panel.id)).filter((a) => visible.has(a.proposalId))
    for (const id of input.assignmentIds) {
      const assignment = standing.find((a) => a.id === id)
      if (!assignment) throw refuse.notFound('assignment')
      if (!(await takeAssignmentBack(tx.db, id, 'taken off by the chair')))
        throw refuse.closed('This review is finished: it counts, and stays.')
    }
    await writeLogbook(tx, {
      action: 'panel.take-off',
      subject: { kind: 'panel', id: desk.panel.id },
      actingAs: 'chair',
      before: standing.filter((a) => input.assignmentIds.includes(a.id)),
    })
    return { taken: input.assignmentIds.length }
  })
}
