import type { Database } from '../client.ts'
import type { PeopleRow, RoleGrantsRow } from '../tables.ts'
import { utcNow } from '../utcNow.ts'

export async function findPerson(db: Database, id: number): Promise<PeopleRow | null> {
  return (await db('people').where({ id }).first()) ?? null
}

/** Holds an account's row, so that nothing is decided about it meanwhile. */
export async function lockPerson(db: Database, id: number): Promise<void> {
  await db('people').where({ id }).forUpdate().first('id')
}

/** By address, compared without case as mail servers do. */
export async function findPersonByEmail(db: Database, email: string): Promise<PeopleRow | null> {
  return (await db('people').where({ email: email.trim() }).first()) ?? null
}

/** Grants in force now, by the database's clock. */
export function grantsInForce(db: Database, personId: number): Promise<RoleGrantsRow[]> {
  return db('role_grants')
    .where({ person_id: personId })
    .whereNull('revoked_at')
    .andWhere('from_at', '<=', db.raw('UTC_TIMESTAMP(3)'))
    .andWhere((q) => q.whereNull('until_at').orWhere('until_at', '>', db.raw('UTC_TIMESTAMP(3)')))
}

export interface NewPerson {
  email: string
  name: string
  sortName: string
  institute: string
  passwordHash: string
}

export async function insertPerson(db: Database, person: NewPerson): Promise<number> {
  const known = await db('institutes').where({ name: person.institute }).first('id')
  const [id] = await db('people').insert({
    email: person.email,
    name: person.name,
    sort_name: person.sortName,
    institute_id: known?.id ?? null,
    institute_text: person.institute,
    password_hash: person.passwordHash,
  })
  return id as number
}

/** Marks the address as proved; false when it was already. */
export async function confirmEmail(db: Database, personId: number): Promise<boolean> {
  const changed = await db('people')
    .where({ id: personId })
    .whereNull('email_confirmed_at')
    .update({ email_confirmed_at: utcNow(db) })
  return changed === 1
}

export interface NewGrant {
  personId: number
  role: RoleGrantsRow['role']
  callId?: number | null
  panelId?: number | null
  instrumentId?: number | null
  grantedBy?: number | null
}

export async function insertGrant(db: Database, grant: NewGrant): Promise<void> {
  await db('role_grants').insert({
    person_id: grant.personId,
    role: grant.role,
    call_id: grant.callId ?? null,
    panel_id: grant.panelId ?? null,
    instrument_id: grant.instrumentId ?? null,
    granted_by: grant.grantedBy ?? null,
    from_at: utcNow(db),
  })
}

/** Sets the password; null leaves the account without one until a link is opened. */
export async function setPassword(
  db: Database,
  personId: number,
  passwordHash: string | null,
): Promise<void> {
  await db('people')
    .where({ id: personId })
    .update({ password_hash: passwordHash, version: db.raw('version + 1') as unknown as number })
}

export interface Profile {
  name: string
  sortName: string
  institute: string
  orcid: string | null
  careerStage: PeopleRow['career_stage']
  timeZone: string
}

/** Saves a profile read at `version`; false when someone saved in between. */
export async function updateProfile(
  db: Database,
  personId: number,
  version: number,
  profile: Profile,
): Promise<boolean> {
  const known = await db('institutes').where({ name: profile.institute }).first('id')
  const changed = await db('people')
    .where({ id: personId, version })
    .update({
      name: profile.name,
      sort_name: profile.sortName,
      institute_id: known?.id ?? null,
      institute_text: profile.institute,
      // Set before the iD itself: assignments are carried out in order.
      orcid_verified_at: db.raw('IF(orcid <=> ?, orcid_verified_at, NULL)', [
        profile.orcid,
      ]) as unknown as Date | null,
      orcid: profile.orcid,
      career_stage: profile.careerStage,
      time_zone: profile.timeZone,
      version: version + 1,
    })
  return changed === 1
}

/** Whether the demonstration's people are here. */
export async function hasDemoPeople(db: Database): Promise<boolean> {
  return (await db('people').where({ is_demo: 1 }).first('id')) !== undefined
}
