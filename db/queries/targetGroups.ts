import type { TargetGroup } from '@/lib/domain/proposals/types'
import type { Database } from '../client.ts'
import type { TargetGroupsRow } from '../tables.ts'

export type GroupValues = Omit<TargetGroup, 'id' | 'version'>

const groupOf = (row: TargetGroupsRow): TargetGroup => ({
  id: row.id,
  name: row.name,
  rule: row.rule,
  atLeast: row.at_least,
  hoursFor: row.hours_for,
  version: row.version,
})

const columnsOf = (values: GroupValues) => ({
  name: values.name,
  rule: values.rule,
  at_least: values.atLeast,
  hours_for: values.hoursFor,
})

/** A proposal's groups of targets, the oldest first. */
export async function groupsOf(db: Database, proposalId: number): Promise<TargetGroup[]> {
  const rows = await db('target_groups').where({ proposal_id: proposalId }).orderBy('id')
  return rows.map(groupOf)
}

export async function insertGroup(db: Database, proposalId: number, values: GroupValues): Promise<number> {
  const [id = 0] = await db('target_groups').insert({ proposal_id: proposalId, ...columnsOf(values) })
  return id
}

/** Writes a group that still has the version it was read with; false when someone was first. */
export async function updateGroup(
  db: Database,
  group: { id: number; version: number },
  values: GroupValues,
): Promise<boolean> {
  const changed = await db('target_groups')
    .where({ id: group.id, version: group.version })
    .update({ ...columnsOf(values), version: group.version + 1 })
  return changed > 0
}

/** Puts targets into a group, or out of any; their rows are new versions, as others may be typing in them. */
export async function putInGroup(
  db: Database,
  targetIds: readonly number[],
  groupId: number | null,
): Promise<void> {
  if (targetIds.length === 0) return
  await db('targets')
    .whereIn('id', targetIds)
    .update({ group_id: groupId, version: db.raw('version + 1') as never })
}

export async function deleteGroup(db: Database, id: number): Promise<void> {
  await db('target_groups').where({ id }).del()
}
