import { z } from 'zod'
import { putInGroup } from '@/db/queries/targetGroups'
import type { Context } from '../context'
import type { TargetGroup } from '../proposals/types'

const id = z.number().int().positive()

/** Where targets go that leave a group, when a change is taken back; into none unless told. */
export const backSchema = z
  .array(z.object({ targetId: id, groupId: id }))
  .max(500)
  .optional()

/** Lets targets out of a group, each into the group it came from where that still stands. */
export async function releaseTargets(
  tx: Context,
  groups: readonly TargetGroup[],
  leaving: readonly { id: number }[],
  back: z.output<typeof backSchema> = [],
): Promise<void> {
  const into = new Map(back.map(({ targetId, groupId }) => [targetId, groupId]))
  const goalOf = (target: { id: number }) =>
    groups.find((group) => group.id === into.get(target.id))?.id ?? null
  for (const goal of new Set(leaving.map(goalOf)))
    await putInGroup(
      tx.db,
      leaving.filter((target) => goalOf(target) === goal).map((target) => target.id),
      goal,
    )
}
