import type { Database } from '../client.ts'
import type { PanelMembersRow } from '../tables.ts'
import { utcNow } from '../utcNow.ts'

/**
 * Gives a person a seat on a panel, under a lock, so that two members never share a number; who left comes back to
 * the old number. A chair beside a chair sits as deputy. Returns the seat.
 */
export async function seatOnPanel(
  db: Database,
  given: { panelId: number; personId: number; isChair: boolean },
): Promise<PanelMembersRow['seat']> {
  const taken = await db('panel_members').where({ panel_id: given.panelId }).forUpdate()
  const own = taken.find((row) => row.person_id === given.personId)
  const hasChair = taken.some((row) => row.seat === 'chair' && row.left_at === null && row !== own)
  const held = own?.left_at === null ? own.seat : null
  const seat = given.isChair ? (hasChair ? 'deputy' : 'chair') : (held ?? 'member')
  if (own) await db('panel_members').where({ id: own.id }).update({ seat, left_at: null })
  else
    await db('panel_members').insert({
      panel_id: given.panelId,
      person_id: given.personId,
      seat,
      number: Math.max(0, ...taken.map((row) => row.number)) + 1,
    })
  return seat
}

/** Brings the seat in line with the roles that are left: a member without the chair's, none without any. */
export async function fitSeatToRoles(db: Database, panelId: number, personId: number): Promise<void> {
  const roles = await db('role_grants')
    .where({ panel_id: panelId, person_id: personId })
    .whereIn('role', ['reviewer', 'chair'])
    .whereNull('revoked_at')
    .andWhere((q) => q.whereNull('until_at').orWhere('until_at', '>', utcNow(db)))
    .select('role')
  const seat = db('panel_members').where({ panel_id: panelId, person_id: personId }).whereNull('left_at')
  if (roles.length === 0) await seat.update({ left_at: utcNow(db) })
  else if (!roles.some(({ role }) => role === 'chair')) await seat.update({ seat: 'member' })
}

/** Reviews a person has in hand on a panel. */
export async function unfinishedReviews(db: Database, panelId: number, personId: number): Promise<number> {
  const [row] = await db('assignments')
    .where({ panel_id: panelId, person_id: personId })
    .whereNull('withdrawn_at')
    .whereNull('finished_at')
    .count<{ n: string }[]>({ n: '*' })
  return Number(row?.n ?? 0)
}
