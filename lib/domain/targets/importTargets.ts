import { z } from 'zod'
import { touchProposal } from '@/db/queries/proposals'
import { groupsOf, insertGroup } from '@/db/queries/targetGroups'
import { insertTarget, targetsOf } from '@/db/queries/targets'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openForEditing } from '../proposals/openProposal'
import { keptValues } from './keptValues'
import { unknownGroups } from '../targetGroups/unknownGroups'
import { requireGroupRoom } from '../targetGroups/groupRules'
import { mostTargets } from './limits'
import { nameKey, nextPosition, requireRoom, saysTheSame } from './targetRules'
import { targetRowSchema } from './schema'
import type { TargetValues } from './types'

export const importTargetsSchema = z.object({
  reference: z.string().max(10),
  rows: z
    .array(targetRowSchema)
    .min(1, 'There is no row to keep.')
    .max(mostTargets, `At most ${mostTargets} rows can be kept at once.`),
})

export type ImportTargetsInput = z.output<typeof importTargetsSchema>

/** Rows to add; one that says what is here already is left out; a clash of names is told at its row. */
function newRows(rows: readonly TargetValues[], present: readonly TargetValues[]): TargetValues[] {
  const known = new Map(present.map((target) => [nameKey(target.name), target]))
  const added: TargetValues[] = []
  const clashes: Record<string, string> = {}
  rows.forEach((row, index) => {
    const same = known.get(nameKey(row.name))
    if (!same) {
      known.set(nameKey(row.name), row)
      added.push(row)
    } else if (!saysTheSame(same, row))
      clashes[`rows.${index}.name`] = `${row.name} is here already with other values.`
  })
  if (Object.keys(clashes).length > 0) throw refuse.invalid('Some rows clash with what is here.', clashes)
  return added
}

/** Keeps all rows of a file or none of them. Groups it names that are not here are made, all of their targets wanted. */
export async function importTargets(
  ctx: Context,
  input: ImportTargetsInput,
): Promise<{ added: number; present: number }> {
  return inTransaction(ctx, async (tx) => {
    const { row, subject } = await openForEditing(tx, input.reference)
    const present = await targetsOf(tx.db, row.id)
    const added = newRows(input.rows, present)
    requireRoom(present.length, added.length)
    const first = nextPosition(present)
    const here = await groupsOf(tx.db, row.id)
    const made = unknownGroups(here, added)
    requireGroupRoom(here.length, made.length)
    for (const name of made)
      await insertGroup(tx.db, row.id, { name, rule: 'all', atLeast: null, hoursFor: 'all' })
    const standing = { kind: subject.kind, groups: await groupsOf(tx.db, row.id) }
    for (const [index, values] of added.entries()) {
      const kept = keptValues(values, standing, `rows.${input.rows.indexOf(values)}`)
      await insertTarget(tx.db, row.id, { ...kept, position: first + index })
    }
    if (added.length > 0) {
      await touchProposal(tx.db, row.id)
      await writeLogbook(tx, {
        action: 'target.import',
        subject: { kind: 'proposal', id: input.reference },
        actingAs: 'investigator',
        after: { names: added.map(({ name }) => name), groups: made },
      })
    }
    return { added: added.length, present: input.rows.length - added.length }
  })
}
