import type { Investigator } from '../../lib/domain/proposals/types.ts'
import type { Database } from '../client.ts'
import type { PeopleRow, ProposalPeopleRow } from '../tables.ts'

type AccountPart = Pick<PeopleRow, 'orcid' | 'orcid_verified_at'>

interface NamedRow extends ProposalPeopleRow {
  owner_id: number | null
  account_orcid: AccountPart['orcid']
  account_orcid_verified_at: AccountPart['orcid_verified_at']
}

function investigatorOf(row: NamedRow): Investigator {
  return {
    id: row.id,
    personId: row.person_id ?? row.owner_id,
    name: row.name,
    email: row.email,
    institute: row.institute,
    role: row.role,
    access: row.access,
    isStudent: row.is_student === 1,
    isSupervisor: row.is_supervisor === 1,
    orcid: row.account_orcid ?? row.orcid,
    isOrcidVerified: row.account_orcid !== null && row.account_orcid_verified_at !== null,
    position: row.position,
    confirmedAt: row.confirmed_at,
    version: row.version,
  }
}

/**
 * Investigators in the order of names. Someone named by an address and owner of an account that has proved
 * that address is that person, whether or not the row has been tied to the account yet.
 */
export async function investigatorsOf(db: Database, proposalId: number): Promise<Investigator[]> {
  const rows = await db('proposal_people as q')
    .leftJoin('people as a', (on) => on.on('a.email', 'q.email').onNotNull('a.email_confirmed_at'))
    .leftJoin('people as o', 'o.id', db.raw('COALESCE(q.person_id, a.id)'))
    .where('q.proposal_id', proposalId)
    .orderBy(['q.position', 'q.id'])
    .select<NamedRow[]>(
      'q.*',
      'a.id as owner_id',
      'o.orcid as account_orcid',
      'o.orcid_verified_at as account_orcid_verified_at',
    )
  return rows.map(investigatorOf)
}

export interface NewInvestigator {
  proposalId: number
  personId: number | null
  name: string
  email: string
  institute: string
  role: Investigator['role']
  access: Investigator['access']
  isStudent: boolean
  isSupervisor: boolean
  orcid: string | null
  position: number
  confirmedAt: Date | null
}

export async function insertInvestigator(db: Database, given: NewInvestigator): Promise<number> {
  const [id] = await db('proposal_people').insert({
    proposal_id: given.proposalId,
    person_id: given.personId,
    name: given.name,
    email: given.email,
    institute: given.institute,
    role: given.role,
    access: given.access,
    is_student: given.isStudent ? 1 : 0,
    is_supervisor: given.isSupervisor ? 1 : 0,
    orcid: given.orcid,
    position: given.position,
    confirmed_at: given.confirmedAt,
  })
  return Number(id)
}

export interface InvestigatorChanges {
  role?: Investigator['role']
  access?: Investigator['access']
  position?: number
}

/** Rights and order, in which each choice stands alone: the last one holds. */
export async function updateInvestigator(
  db: Database,
  id: number,
  { role, access, position }: InvestigatorChanges,
): Promise<void> {
  await db('proposal_people')
    .where({ id })
    .update({
      ...(role ? { role } : {}),
      ...(access ? { access } : {}),
      ...(position === undefined ? {} : { position }),
    })
}

/** Writes what is said of someone who still has the version read; false when another change was first. */
export async function updateDescription(
  db: Database,
  person: { id: number; version: number },
  said: Pick<Investigator, 'institute' | 'orcid' | 'isStudent' | 'isSupervisor'>,
): Promise<boolean> {
  const changed = await db('proposal_people')
    .where({ id: person.id, version: person.version })
    .update({
      institute: said.institute,
      orcid: said.orcid,
      is_student: said.isStudent ? 1 : 0,
      is_supervisor: said.isSupervisor ? 1 : 0,
      version: person.version + 1,
    })
  return changed > 0
}

/** Someone named agrees; the name and the institute are a new version of what is said of them. */
export async function confirmInvestigator(
  db: Database,
  id: number,
  own: { personId: number; name: string; institute: string; confirmedAt: Date },
): Promise<void> {
  await db('proposal_people')
    .where({ id })
    .update({
      person_id: own.personId,
      name: own.name,
      institute: own.institute,
      confirmed_at: own.confirmedAt,
      version: db.raw('version + 1') as never,
    })
}

export async function deleteInvestigator(db: Database, id: number): Promise<void> {
  await db('proposal_people').where({ id }).delete()
}
