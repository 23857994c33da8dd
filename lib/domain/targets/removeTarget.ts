import { z } from 'zod'
import { observationsOf } from '@/db/queries/observations'
import { touchProposal } from '@/db/queries/proposals'
import { deleteTarget, findTarget } from '@/db/queries/targets'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openForEditing } from '../proposals/openProposal'

export const removeTargetSchema = z.object({
  reference: z.string().max(10),
  id: z.number().int().positive(),
})

export type RemoveTargetInput = z.output<typeof removeTargetSchema>

/** Takes a target and its observations out of a draft. The logbook keeps both, so that it can be taken back. */
export async function removeTarget(
  ctx: Context,
  input: RemoveTargetInput,
): Promise<{ id: number; name: string }> {
  return inTransaction(ctx, async (tx) => {
    const { row } = await openForEditing(tx, input.reference)
    const target = await findTarget(tx.db, row.id, input.id)
    if (!target) throw refuse.notFound('target')
    const all = await observationsOf(tx.db, row.id)
    const observations = all.filter(({ targetId }) => targetId === target.id)
    await deleteTarget(tx.db, target.id)
    await touchProposal(tx.db, row.id)
    await writeLogbook(tx, {
      action: 'target.remove',
      subject: { kind: 'proposal', id: input.reference },
      actingAs: 'investigator',
      before: { target, observations },
    })
    return { id: target.id, name: target.name }
  })
}
