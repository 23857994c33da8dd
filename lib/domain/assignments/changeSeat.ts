import { panelAssignments, setSeat } from '@/db/queries/assignments'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openPanel } from '../panels/openPanel'
import type { SeatInput } from './schema'

/** Gives a reader another seat; whoever held a first or second seat takes the one left free. */
export function changeSeat(ctx: ActingContext, input: SeatInput): Promise<void> {
  return inTransaction(ctx, async (tx) => {
    const desk = await openPanel(tx, { panelId: input.panelId, lock: true })
    if (desk.phase === 'decided' || desk.phase === 'archived')
      throw refuse.closed('The decisions of this call are made known: seats stay as they are.')
    const visible = new Set(desk.proposals.map(({ id }) => id))
    const standing = (await panelAssignments(tx.db, desk.panel.id)).filter((a) => visible.has(a.proposalId))
    const chosen = standing.find((a) => a.id === input.assignmentId)
    if (!chosen) throw refuse.notFound('assignment')
    if (chosen.seat === input.seat) return
    const holder =
      input.seat === 'reader'
        ? undefined
        : standing.find((a) => a.proposalId === chosen.proposalId && a.seat === input.seat)
    if (holder) await setSeat(tx.db, holder.id, chosen.seat)
    await setSeat(tx.db, chosen.id, input.seat)
    await writeLogbook(tx, {
      action: 'panel.seat',
      subject: { kind: 'assignment', id: chosen.id },
      actingAs: 'chair',
      before: { seat: chosen.seat },
      after: { seat: input.seat },
    })
  })
}
