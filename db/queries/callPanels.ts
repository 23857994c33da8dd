import type { CallPanel } from '../../lib/domain/calls/types.ts'
import type { Database } from '../client.ts'

/** Panels of a call with how many sit on each. */
export async function callPanels(db: Database, callId: number): Promise<CallPanel[]> {
  const rows = (await db('panels as n')
    .where('n.call_id', callId)
    .orderBy('n.id')
    .select('n.id', 'n.name', 'n.quorum', {
      members: db('panel_members').whereRaw('panel_id = n.id').whereNull('left_at').count('*'),
    })) as (Omit<CallPanel, 'members'> & { members: number | string })[]
  return rows.map((row) => ({ ...row, members: Number(row.members) }))
}

/** Proposals, seats and roles that hang on a panel: one with any stays. */
export async function panelUses(
  db: Database,
  panelId: number,
): Promise<{ proposals: number; people: number }> {
  const [proposals, members, grants] = await Promise.all([
    db('proposals').where({ panel_id: panelId }).count({ n: '*' }).first(),
    db('panel_members').where({ panel_id: panelId }).count({ n: '*' }).first(),
    db('role_grants').where({ panel_id: panelId }).count({ n: '*' }).first(),
  ])
  return { proposals: Number(proposals?.n ?? 0), people: Number(members?.n ?? 0) + Number(grants?.n ?? 0) }
}

export async function insertPanel(
  db: Database,
  callId: number,
  panel: { name: string; quorum: number },
): Promise<number> {
  const [id] = await db('panels').insert({ ...panel, call_id: callId })
  return Number(id)
}

export async function updatePanel(
  db: Database,
  id: number,
  panel: { name: string; quorum: number },
): Promise<void> {
  await db('panels').where({ id }).update(panel)
}

export async function deletePanel(db: Database, id: number): Promise<void> {
  await db('panels').where({ id }).delete()
}
