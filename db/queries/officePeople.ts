import type { Database } from '../client.ts'
import { utcNow } from '../utcNow.ts'

export interface OfficePerson {
  id: number
  name: string
  email: string
  institute: string
  confirmedAt: Date | null
  disabledAt: Date | null
  addressFailedAt: Date | null
  erasureAskedAt: Date | null
  roles: { role: string; call: number | null; panel: string | null; instrument: string | null }[]
}

/** Everyone with an account and the roles in force, by name; two queries whatever the number. */
export async function listPeople(db: Database): Promise<OfficePerson[]> {
  const [people, grants] = await Promise.all([
    // Who was merged into another or erased is nobody to look for.
    db('people').whereNull('merged_into_id').whereNull('erased_at').orderBy('sort_name').limit(5000),
    db('role_grants as g')
      .leftJoin('calls as c', 'c.id', 'g.call_id')
      .leftJoin('panels as p', 'p.id', 'g.panel_id')
      .leftJoin('instruments as i', 'i.id', 'g.instrument_id')
      .whereNull('g.revoked_at')
      .andWhere((q) => q.whereNull('g.until_at').orWhere('g.until_at', '>', utcNow(db)))
      .select<
        {
          person_id: number
          role: string
          call: number | null
          panel: string | null
          instrument: string | null
        }[]
      >('g.person_id', 'g.role', 'c.number as call', 'p.name as panel', 'i.name as instrument'),
  ])
  const byPerson = new Map<number, typeof grants>()
  for (const grant of grants) byPerson.set(grant.person_id, [...(byPerson.get(grant.person_id) ?? []), grant])
  return people.map((row) => ({
    id: row.id,
    name: row.name,
    email: row.email,
    institute: row.institute_text,
    confirmedAt: row.email_confirmed_at,
    disabledAt: row.disabled_at,
    addressFailedAt: row.address_failed_at,
    erasureAskedAt: row.erasure_asked_at,
    roles: (byPerson.get(row.id) ?? []).map(({ role, call, panel, instrument }) => ({
      role,
      call,
      panel,
      instrument,
    })),
  }))
}

export interface OpenInvitationLine {
  id: number
  name: string
  email: string
  role: string
  panel: string | null
  call: number | null
  instrument: string | null
  expiresAt: Date
}

/** Invitations not yet accepted or taken back. */
export async function listOpenInvitations(db: Database): Promise<OpenInvitationLine[]> {
  return (
    db('invitations as i')
      .leftJoin('calls as c', 'c.id', 'i.call_id')
      .leftJoin('panels as p', 'p.id', 'i.panel_id')
      .leftJoin('instruments as n', 'n.id', 'i.instrument_id')
      .whereNull('i.accepted_at')
      .whereNull('i.withdrawn_at')
      // Names on a proposal are its investigators' affair.
      .whereNull('i.proposal_id')
      .andWhere('i.expires_at', '>', utcNow(db))
      .orderBy('i.id', 'desc')
      .select<OpenInvitationLine[]>(
        'i.id',
        'i.name',
        'i.email',
        'i.role',
        'p.name as panel',
        'c.number as call',
        'n.name as instrument',
        'i.expires_at as expiresAt',
      )
  )
}

/** Shuts or reopens an account; false when it was so already. */
export async function setDisabled(db: Database, personId: number, isDisabled: boolean): Promise<boolean> {
  const changed = await db('people')
    .where({ id: personId })
    .modify((q) => (isDisabled ? q.whereNull('disabled_at') : q.whereNotNull('disabled_at')))
    .update({ disabled_at: isDisabled ? utcNow(db) : null })
  return changed === 1
}

/** Accounts that hold the office's role and are not shut. */
export async function countOffice(db: Database): Promise<number> {
  const [row] = await db('role_grants as g')
    .join('people as p', 'p.id', 'g.person_id')
    .where('g.role', 'office')
    .whereNull('g.revoked_at')
    .andWhere('g.from_at', '<=', utcNow(db))
    .andWhere((q) => q.whereNull('g.until_at').orWhere('g.until_at', '>', utcNow(db)))
    .whereNull('p.disabled_at')
    .countDistinct<{ n: string }[]>('p.id as n')
  return Number(row?.n ?? 0)
}
