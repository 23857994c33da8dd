import { z } from 'zod'
import { touchProposal } from '@/db/queries/proposals'
import { groupsOf } from '@/db/queries/targetGroups'
import { findTarget, targetsOf, updateTarget } from '@/db/queries/targets'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openForEditing } from '../proposals/openProposal'
import { staleProposal } from '../proposals/staleProposal'
import type { Target } from '../proposals/types'
import { keptValues } from './keptValues'
import { requireFreeName } from './targetRules'
import { targetRowSchema } from './schema'
import { targetRow } from './targetRow'

export const saveTargetSchema = z.object({
  reference: z.string().max(10),
  id: z.number().int().positive(),
  version: z.number().int().positive(),
  row: targetRowSchema,
})

export type SaveTargetInput = z.output<typeof saveTargetSchema>

/** Saves one row. Who comes second is shown what the first one wrote; nothing is overwritten. */
export async function saveTarget(ctx: Context, input: SaveTargetInput): Promise<Target> {
  return inTransaction(ctx, async (tx) => {
    const { row, subject } = await openForEditing(tx, input.reference)
    const present = await targetsOf(tx.db, row.id)
    const before = present.find(({ id }) => id === input.id)
    if (!before) throw refuse.notFound('target')
    if (before.version !== input.version)
      throw await staleProposal(
        tx,
        { reference: input.reference, version: before.version, updated_at: row.updated_at },
        targetRow(before),
      )
    requireFreeName(present, input.row.name, input.id, 'row.name')
    const standing = { kind: subject.kind, groups: await groupsOf(tx.db, row.id) }
    const values = keptValues(input.row, standing, 'row')
    await updateTarget(tx.db, row.id, before, { ...values, position: before.position })
    const target = await findTarget(tx.db, row.id, input.id)
    if (!target) throw refuse.integrity('The target could not be read back.')
    await touchProposal(tx.db, row.id)
    await writeLogbook(tx, {
      action: 'target.save',
      subject: { kind: 'proposal', id: input.reference },
      actingAs: 'investigator',
      before: { target: before },
      after: { target },
    })
    return target
  })
}
