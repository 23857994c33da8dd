import { z } from 'zod'
import { touchProposal } from '@/db/queries/proposals'
import { deleteGroup, groupsOf, putInGroup } from '@/db/queries/targetGroups'
import { targetsOf } from '@/db/queries/targets'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openForEditing } from '../proposals/openProposal'

export const removeGroupSchema = z.object({
  reference: z.string().max(10),
  id: z.number().int().positive(),
})

export type RemoveGroupInput = z.output<typeof removeGroupSchema>

/** Takes a group out of a draft. Its targets stay, each by its own word. */
export async function removeGroup(ctx: Context, input: RemoveGroupInput): Promise<{ name: string }> {
  return inTransaction(ctx, async (tx) => {
    const { row } = await openForEditing(tx, input.reference)
    const group = (await groupsOf(tx.db, row.id)).find(({ id }) => id === input.id)
    if (!group) throw refuse.notFound('group')
    const members = (await targetsOf(tx.db, row.id)).filter((target) => target.group === group.name)
    await putInGroup(
      tx.db,
      members.map(({ id }) => id),
      null,
    )
    await deleteGroup(tx.db, group.id)
    await touchProposal(tx.db, row.id)
    await writeLogbook(tx, {
      action: 'group.remove',
      subject: { kind: 'proposal', id: input.reference },
      actingAs: 'investigator',
      before: { group, names: members.map(({ name }) => name) },
    })
    return { name: group.name }
  })
}
