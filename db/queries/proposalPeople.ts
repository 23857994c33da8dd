import type { Investigator } from '../../lib/domain/proposals/types.ts'
import type { Database } from '../client.ts'
import type { ProposalPeopleRow } from '../tables.ts'

function investigatorOf(row: ProposalPeopleRow): Investigator {
  return {
    id: row.id,
    personId: row.person_id,
    name: row.name,
    email: row.email,
    institute: row.institute,
    role: row.role,
    access: row.access,
    isStudent: row.is_student === 1,
    position: row.position,
    confirmedAt: row.confirmed_at,
  }
}

/**
 * Investigators in the order of names. Someone named by an address and owner of an account that has proved
 * that address is that person, whether or not the row has been tied to the account yet.
 */
export async function investigatorsOf(db: Database, proposalId: number): Promise<Investigator[]> {
  const rows = await db('proposal_people as q')
    .leftJoin('people as a', (on) => on.on('a.email', 'q.email').onNotNull('a.email_confirmed_at'))
    .where('q.proposal_id', proposalId)
    .orderBy(['q.position', 'q.id'])
    .select<(ProposalPeopleRow & { owner_id: number | null })[]>('q.*', 'a.id as owner_id')
  return rows.map((row) => ({ ...investigatorOf(row), personId: row.person_id ?? row.owner_id }))
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
    position: given.position,
    confirmed_at: given.confirmedAt,
  })
  return Number(id)
}

export interface InvestigatorChanges {
  access?: Investigator['access']
  isStudent?: boolean
  position?: number
  personId?: number
  name?: string
  institute?: string
  confirmedAt?: Date
}

export async function updateInvestigator(
  db: Database,
  id: number,
  { access, isStudent, position, personId, name, institute, confirmedAt }: InvestigatorChanges,
): Promise<void> {
  await db('proposal_people')
    .where({ id })
    .update({
      ...(access ? { access } : {}),
      ...(isStudent === undefined ? {} : { is_student: isStudent ? 1 : 0 }),
      ...(position === undefined ? {} : { position }),
      ...(personId ? { person_id: personId } : {}),
      ...(name ? { name } : {}),
      ...(institute === undefined ? {} : { institute }),
      ...(confirmedAt ? { confirmed_at: confirmedAt } : {}),
    })
}

export async function deleteInvestigator(db: Database, id: number): Promise<void> {
  await db('proposal_people').where({ id }).delete()
}
