import type { Database } from '../client.ts'
import type { PanelMembersRow, RoleGrantsRow } from '../tables.ts'

export interface RoleHolder {
  personId: number
  name: string
  email: string
}

/** People with an open account who hold a role now, by the database's clock; in the order of their accounts. */
function holding(db: Database, role: RoleGrantsRow['role']) {
  return db('role_grants as g')
    .join('people as a', 'a.id', 'g.person_id')
    .where('g.role', role)
    .whereNull('g.revoked_at')
    .andWhere('g.from_at', '<=', db.raw('UTC_TIMESTAMP(3)'))
    .andWhere((q) => q.whereNull('g.until_at').orWhere('g.until_at', '>', db.raw('UTC_TIMESTAMP(3)')))
    .whereNull('a.disabled_at')
    .orderBy('a.id')
    .distinct<RoleHolder[]>({ personId: 'a.id', name: 'a.name', email: 'a.email' })
}

/** Who works in the office. */
export const officePeople = (db: Database): Promise<RoleHolder[]> => holding(db, 'office')

/** Who leads a panel: its chair and its deputy, by seat and by role. */
export async function panelLeaders(db: Database, panelId: number): Promise<RoleHolder[]> {
  const leading: PanelMembersRow['seat'][] = ['chair', 'deputy']
  return holding(db, 'chair')
    .join('panels as p', 'p.id', db.raw('?', [panelId]))
    .join('panel_members as m', (on) => on.on('m.panel_id', 'p.id').on('m.person_id', 'a.id'))
    .whereIn('m.seat', leading)
    .whereNull('m.left_at')
    .andWhere((q) => q.whereNull('g.panel_id').orWhere('g.panel_id', panelId))
    .andWhere((q) => q.whereNull('g.call_id').orWhere('g.call_id', db.ref('p.call_id')))
}
