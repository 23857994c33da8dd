import type { Database } from '../client.ts'
import type { ProposalsRow } from '../tables.ts'

/** Locks a programme until the transaction ends, so that it is carried into a call once. */
export async function lockProgramme(db: Database, id: number): Promise<void> {
  await db('programmes').where({ id }).forUpdate().first('id')
}

/** The proposal of a programme in a call, drafts put away left out; read at its newest, under a lock. */
export async function programmeInCall(
  db: Database,
  programmeId: number,
  callId: number,
): Promise<{ id: number; reference: string } | null> {
  const row = await db('proposals')
    .where({ programme_id: programmeId, call_id: callId })
    .whereNot({ state: 'withdrawn' })
    .forUpdate()
    .first('id', 'reference')
  return row ?? null
}

export interface ProgrammeProposal {
  id: number
  reference: string
  title: string
  state: ProposalsRow['state']
  isReopened: boolean
  callNumber: number
}

/** The other proposals of a programme that name this person, by account or by proved address; newest call first. */
export function othersOfProgramme(
  db: Database,
  given: { programmeId: number; exceptId: number; person: { id: number; email: string } },
): Promise<ProgrammeProposal[]> {
  return db('proposals as p')
    .join('calls as c', 'c.id', 'p.call_id')
    .where('p.programme_id', given.programmeId)
    .whereNot('p.id', given.exceptId)
    .whereExists(
      db('proposal_people as q')
        .select('q.id')
        .whereRaw('q.proposal_id = p.id')
        .whereNotNull('q.confirmed_at')
        .andWhere((named) =>
          named
            .where('q.person_id', given.person.id)
            .orWhere((byAddress) =>
              byAddress.whereNull('q.person_id').andWhere('q.email', given.person.email),
            ),
        ),
    )
    .orderBy([
      { column: 'c.number', order: 'desc' },
      { column: 'p.id', order: 'desc' },
    ])
    .select({
      id: 'p.id',
      reference: 'p.reference',
      title: 'p.title',
      state: 'p.state',
      isReopened: 'p.is_reopened',
      callNumber: 'c.number',
    })
    .then((rows: (Omit<ProgrammeProposal, 'isReopened'> & { isReopened: 0 | 1 })[]) =>
      rows.map((row) => ({ ...row, isReopened: row.isReopened === 1 })),
    )
}
