import type { Database } from '../client.ts'
import type { PeopleRow, RoleGrantsRow } from '../tables.ts'

export async function findPerson(db: Database, id: number): Promise<PeopleRow | null> {
  return (await db('people').where({ id }).first()) ?? null
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
