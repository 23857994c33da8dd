import type { Database } from '../client.ts'
import type { AssignmentsRow, ProposalsRow } from '../tables.ts'
import { utcNow } from '../utcNow.ts'

export interface AssignmentFacts {
  id: number
  proposalId: number
  personId: number
  panelId: number
  seat: AssignmentsRow['seat']
  finishedAt: Date | null
  withdrawnAt: Date | null
  version: number
  callId: number
  proposalState: ProposalsRow['state']
  reviewNumber: string | null
}

const columns = {
  id: 'a.id',
  proposalId: 'a.proposal_id',
  personId: 'a.person_id',
  panelId: 'a.panel_id',
  seat: 'a.seat',
  finishedAt: 'a.finished_at',
  withdrawnAt: 'a.withdrawn_at',
  version: 'a.version',
  callId: 'p.call_id',
  proposalState: 'p.state',
  reviewNumber: 'p.review_number',
} as const

const assignments = (db: Database) =>
  db('assignments as a').join('proposals as p', 'p.id', 'a.proposal_id').select(columns)

export async function findAssignment(
  db: Database,
  id: number,
  lock: boolean,
): Promise<AssignmentFacts | null> {
  if (lock) await db('assignments').where({ id }).forUpdate().first('id')
  const row: AssignmentFacts | undefined = await assignments(db).where('a.id', id).first()
  return row ?? null
}

/** Standing assignments of a person, by review number. */
export function standingAssignments(
  db: Database,
  personId: number,
  callId?: number,
): Promise<AssignmentFacts[]> {
  return assignments(db)
    .where('a.person_id', personId)
    .whereNull('a.withdrawn_at')
    .modify((q) => {
      if (callId !== undefined) void q.where('p.call_id', callId)
    })
    .orderBy(['p.call_id', 'p.review_number'])
}

/** The same of one call, locked until the transaction ends. */
export async function lockAssignmentsOf(
  db: Database,
  personId: number,
  callId: number,
): Promise<AssignmentFacts[]> {
  await db('assignments').where({ person_id: personId }).forUpdate().select('id')
  return standingAssignments(db, personId, callId)
}

/** Takes an assignment back and keeps the recusal as an event of its own: given anew, the assignment would forget it. */
export async function withdrawAssignment(db: Database, id: number, reason: string): Promise<void> {
  await db('assignments')
    .where({ id })
    .whereNull('withdrawn_at')
    .update({
      withdrawn_at: utcNow(db),
      withdrawn_reason: reason,
      version: db.raw('version + 1') as unknown as number,
    })
  await db('recusals').insert({ assignment_id: id, reason })
}

/** Marks a review finished or open again, if nobody changed the assignment meanwhile. */
export async function setReviewFinished(
  db: Database,
  id: number,
  version: number,
  finished: boolean,
): Promise<boolean> {
  const count = await db('assignments')
    .where({ id, version })
    .update({
      finished_at: finished ? utcNow(db) : null,
      version: version + 1,
    })
  return count === 1
}
