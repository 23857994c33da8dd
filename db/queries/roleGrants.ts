import type { Database } from '../client.ts'
import type { RoleGrantsRow } from '../tables.ts'
import { utcNow } from '../utcNow.ts'

export interface GrantLine {
  id: number
  personId: number
  role: RoleGrantsRow['role']
  callId: number | null
  call: number | null
  panelId: number | null
  panel: string | null
  instrumentId: number | null
  instrument: string | null
  fromAt: Date
  untilAt: Date | null
  revokedAt: Date | null
  grantedBy: string | null
}

const lines = (db: Database) =>
  db('role_grants as g')
    .leftJoin('calls as c', 'c.id', 'g.call_id')
    .leftJoin('panels as p', 'p.id', 'g.panel_id')
    .leftJoin('instruments as i', 'i.id', 'g.instrument_id')
    .leftJoin('people as b', 'b.id', 'g.granted_by')
    .select<GrantLine[]>({
      id: 'g.id',
      personId: 'g.person_id',
      role: 'g.role',
      callId: 'g.call_id',
      call: 'c.number',
      panelId: 'g.panel_id',
      panel: 'p.name',
      instrumentId: 'g.instrument_id',
      instrument: 'i.name',
      fromAt: 'g.from_at',
      untilAt: 'g.until_at',
      revokedAt: 'g.revoked_at',
      grantedBy: 'b.name',
    })

/** Every role a person holds, is to hold or has held, the newest first. */
export const grantsOfPerson = (db: Database, personId: number): Promise<GrantLine[]> =>
  lines(db).where('g.person_id', personId).orderBy('g.id', 'desc')

export async function findGrant(db: Database, id: number): Promise<GrantLine | null> {
  const [line] = await lines(db).where('g.id', id).limit(1)
  return line ?? null
}

export interface GrantWanted {
  personId: number
  role: RoleGrantsRow['role']
  callId: number | null
  panelId: number | null
  instrumentId: number | null
}

/** Whether the same role in the same scope is held, or is to be held, already. */
export async function holdsAlready(db: Database, wanted: GrantWanted): Promise<boolean> {
  const row = await db('role_grants')
    .where({
      person_id: wanted.personId,
      role: wanted.role,
      call_id: wanted.callId,
      panel_id: wanted.panelId,
      instrument_id: wanted.instrumentId,
    })
    .whereNull('revoked_at')
    .andWhere((q) => q.whereNull('until_at').orWhere('until_at', '>', utcNow(db)))
    .first('id')
  return row !== undefined
}

/** Gives a role between two moments; without them from now, and without an end. */
export async function insertDatedGrant(
  db: Database,
  wanted: GrantWanted & { fromAt: Date | null; untilAt: Date | null; grantedBy: number | null },
): Promise<number> {
  const [id] = await db('role_grants').insert({
    person_id: wanted.personId,
    role: wanted.role,
    call_id: wanted.callId,
    panel_id: wanted.panelId,
    instrument_id: wanted.instrumentId,
    granted_by: wanted.grantedBy,
    from_at: wanted.fromAt ?? utcNow(db),
    until_at: wanted.untilAt,
  })
  return id as number
}

/** Ends a role now; false when it has ended already. */
export async function revokeGrant(db: Database, id: number): Promise<boolean> {
  const changed = await db('role_grants')
    .where({ id })
    .whereNull('revoked_at')
    .andWhere((q) => q.whereNull('until_at').orWhere('until_at', '>', utcNow(db)))
    .update({ revoked_at: utcNow(db) })
  return changed === 1
}
