import { z } from 'zod'
import { touchProposal } from '@/db/queries/proposals'
import { groupsOf, insertGroup, putInGroup, updateGroup } from '@/db/queries/targetGroups'
import { targetsOf } from '@/db/queries/targets'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openForEditing } from '../proposals/openProposal'
import { staleProposal } from '../proposals/staleProposal'
import type { TargetGroup } from '../proposals/types'
import { groupRow } from './groupRow'
import { chosenTargets, requireFreeGroupName, requireGroupRoom } from './groupRules'
import { backSchema, releaseTargets } from './releaseTargets'
import { groupSchema } from './schema'

export const saveGroupSchema = z.object({
  reference: z.string().max(10),
  /** Null makes a new group. */
  id: z.number().int().positive().nullable(),
  version: z.number().int().nonnegative(),
  group: groupSchema,
  back: backSchema,
})

/** A group as kept, and the targets that came into it or left it, with their new versions. */
export type SavedGroup = TargetGroup & { moved: { id: number; version: number }[] }

export type SaveGroupInput = z.output<typeof saveGroupSchema>

/** Saves the name, the rule and the targets of a group, or makes a new one. A target stands in one group at most. */
export async function saveGroup(ctx: Context, input: SaveGroupInput): Promise<SavedGroup> {
  return inTransaction(ctx, async (tx) => {
    const { row } = await openForEditing(tx, input.reference)
    const [groups, targets] = [await groupsOf(tx.db, row.id), await targetsOf(tx.db, row.id)]
    const before = groups.find(({ id }) => id === input.id) ?? null
    if (input.id !== null && !before) throw refuse.notFound('group')
    if (before && before.version !== input.version)
      throw await staleProposal(
        tx,
        { reference: input.reference, version: before.version, updated_at: row.updated_at },
        groupRow(before, targets),
      )
    const { targetIds, ...values } = input.group
    requireFreeGroupName(groups, values.name, input.id, 'group.name')
    if (!before) requireGroupRoom(groups.length, 1)
    const chosen = chosenTargets(targets, targetIds)

    const id = before?.id ?? (await insertGroup(tx.db, row.id, values))
    if (before) await updateGroup(tx.db, before, values)
    const had = before ? targets.filter(({ group }) => group === before.name) : []
    const out = had.filter((target) => !chosen.includes(target))
    const isRenamed = before !== null && before.name !== values.name
    const into = chosen.filter((target) => isRenamed || !had.includes(target))
    await releaseTargets(tx, groups, out, input.back)
    await putInGroup(tx.db, ids(into), id)
    await touchProposal(tx.db, row.id)
    await writeLogbook(tx, {
      action: 'group.save',
      subject: { kind: 'proposal', id: input.reference },
      actingAs: 'investigator',
      before: before ? { group: before, names: names(had) } : undefined,
      after: { group: values, names: names(chosen) },
    })
    const moved = [...out, ...into].map((target) => ({ id: target.id, version: target.version + 1 }))
    return { ...values, id, version: before ? before.version + 1 : 1, moved }
  })
}

const ids = (targets: readonly { id: number }[]) => targets.map(({ id }) => id)
const names = (targets: readonly { name: string }[]) => targets.map(({ name }) => name)
