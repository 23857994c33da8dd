import { z } from 'zod'
import { touchProposal } from '@/db/queries/proposals'
import { deleteGroup, groupsOf } from '@/db/queries/targetGroups'
import { targetsOf } from '@/db/queries/targets'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openForEditing } from '../proposals/openProposal'
import { staleProposal } from '../proposals/staleProposal'
import { groupRow } from './groupRow'
import { backSchema, releaseTargets } from './releaseTargets'

export const removeGroupSchema = z.object({
  reference: z.string().max(10),
  id: z.number().int().positive(),
  /** As it was read, by those who take out only that; without it, as it stands. */
  version: z.number().int().positive().optional(),
  back: backSchema,
})

export interface RemovedGroup {
  name: string
  /** The targets that were in it, with their new versions. */
  moved: { id: number; version: number }[]
}

export type RemoveGroupInput = z.output<typeof removeGroupSchema>

/** Takes a group out of a draft. Its targets stay, each by its own word. */
export async function removeGroup(ctx: Context, input: RemoveGroupInput): Promise<RemovedGroup> {
  return inTransaction(ctx, async (tx) => {
    const { row } = await openForEditing(tx, input.reference)
    const groups = await groupsOf(tx.db, row.id)
    const group = groups.find(({ id }) => id === input.id)
    if (!group) throw refuse.notFound('group')
    const targets = await targetsOf(tx.db, row.id)
    if (input.version !== undefined && input.version !== group.version)
      throw await staleProposal(
        tx,
        { reference: input.reference, version: group.version, updated_at: row.updated_at },
        groupRow(group, targets),
      )
    const members = targets.filter((target) => target.group === group.name)
    await releaseTargets(tx, groups, members, input.back)
    await deleteGroup(tx.db, group.id)
    await touchProposal(tx.db, row.id)
    await writeLogbook(tx, {
      action: 'group.remove',
      subject: { kind: 'proposal', id: input.reference },
      actingAs: 'investigator',
      before: { group, names: members.map(({ name }) => name) },
    })
    return { name: group.name, moved: members.map(({ id, version }) => ({ id, version: version + 1 })) }
  })
}
