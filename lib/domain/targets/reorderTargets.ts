import { z } from 'zod'
import { touchProposal } from '@/db/queries/proposals'
import { placeTarget, targetsOf } from '@/db/queries/targets'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openForEditing } from '../proposals/openProposal'
import { mostTargets } from './limits'
import { inOrder } from './targetRules'

export const reorderTargetsSchema = z.object({
  reference: z.string().max(10),
  ids: z.array(z.number().int().positive()).max(mostTargets),
})

export type ReorderTargetsInput = z.output<typeof reorderTargetsSchema>

/** Puts the targets into the order given, which must name each of them once. */
export async function reorderTargets(ctx: Context, input: ReorderTargetsInput): Promise<void> {
  await inTransaction(ctx, async (tx) => {
    const { row } = await openForEditing(tx, input.reference)
    const present = await targetsOf(tx.db, row.id)
    const ordered = inOrder(present, input.ids)
    if (!ordered)
      throw refuse.invalid('The targets changed meanwhile. Load the page anew, then move them again.')
    for (const [index, target] of ordered.entries())
      if (target.position !== index + 1) await placeTarget(tx.db, target.id, index + 1)
    await touchProposal(tx.db, row.id)
    await writeLogbook(tx, {
      action: 'target.reorder',
      subject: { kind: 'proposal', id: input.reference },
      actingAs: 'investigator',
      before: { order: present.map(({ name }) => name) },
      after: { order: ordered.map(({ name }) => name) },
    })
  })
}
