import { z } from 'zod'
import { constraintSetsOf, insertConstraintSet, updateConstraintSet } from '@/db/queries/observations'
import { touchProposal } from '@/db/queries/proposals'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openForEditing } from '../proposals/openProposal'
import { staleProposal } from '../proposals/staleProposal'
import type { ConstraintSet } from '../proposals/types'
import { constraintRow, constraintSchema } from './constraintSchema'

export const saveConstraintSetSchema = z.object({
  reference: z.string().max(10),
  /** Null makes a new set. */
  id: z.number().int().positive().nullable(),
  version: z.number().int().nonnegative(),
  set: constraintSchema,
})

export type SaveConstraintSetInput = z.output<typeof saveConstraintSetSchema>

const mostSets = 20

/** Saves the conditions asked for, or makes a new set of them. */
export async function saveConstraintSet(ctx: Context, input: SaveConstraintSetInput): Promise<ConstraintSet> {
  return inTransaction(ctx, async (tx) => {
    const { row } = await openForEditing(tx, input.reference)
    const present = await constraintSetsOf(tx.db, row.id)
    const before = present.find(({ id }) => id === input.id)
    if (input.id !== null && !before) throw refuse.notFound('set of conditions')
    if (before && before.version !== input.version)
      throw await staleProposal(
        tx,
        { reference: input.reference, version: before.version, updated_at: row.updated_at },
        constraintRow(before),
      )
    if (!before && present.length >= mostSets)
      throw refuse.invalid(`A proposal holds at most ${mostSets} sets of conditions.`)
    const id = before?.id ?? (await insertConstraintSet(tx.db, row.id, input.set))
    if (before) await updateConstraintSet(tx.db, before, input.set)
    await touchProposal(tx.db, row.id)
    await writeLogbook(tx, {
      action: 'constraints.save',
      subject: { kind: 'proposal', id: input.reference },
      actingAs: 'investigator',
      before: before ? { set: before } : undefined,
      after: { set: input.set },
    })
    return { ...input.set, id, version: before ? before.version + 1 : 1 }
  })
}
