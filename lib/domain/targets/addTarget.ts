import { z } from 'zod'
import { touchProposal } from '@/db/queries/proposals'
import { groupsOf } from '@/db/queries/targetGroups'
import { findTarget, insertTarget, targetsOf } from '@/db/queries/targets'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openForEditing } from '../proposals/openProposal'
import type { Target } from '../proposals/types'
import { keptValues } from './keptValues'
import { nextPosition, requireFreeName, requireRoom } from './targetRules'
import { targetRowSchema } from './schema'

export const addTargetSchema = z.object({ reference: z.string().max(10), row: targetRowSchema })

export type AddTargetInput = z.output<typeof addTargetSchema>

/** Adds a target at the end of the table. */
export async function addTarget(ctx: Context, input: AddTargetInput): Promise<Target> {
  return inTransaction(ctx, async (tx) => {
    const { row, subject } = await openForEditing(tx, input.reference)
    const present = await targetsOf(tx.db, row.id)
    requireRoom(present.length, 1)
    requireFreeName(present, input.row.name, null, 'row.name')
    const standing = { kind: subject.kind, groups: await groupsOf(tx.db, row.id) }
    const values = keptValues(input.row, standing, 'row')
    const id = await insertTarget(tx.db, row.id, { ...values, position: nextPosition(present) })
    const target = await findTarget(tx.db, row.id, id)
    if (!target) throw refuse.integrity('The target could not be read back.')
    await touchProposal(tx.db, row.id)
    await writeLogbook(tx, {
      action: 'target.add',
      subject: { kind: 'proposal', id: input.reference },
      actingAs: 'investigator',
      after: { target },
    })
    return target
  })
}
