import type { Assessment, InstrumentAssessment } from '../../lib/domain/assessments/types.ts'
import type { Database } from '../client.ts'
import type { AssessmentsRow, ProposalsRow } from '../tables.ts'
import { utcNow } from '../utcNow.ts'

export interface RequestRow {
  id: number
  proposalId: number
  instrumentId: number
  instrument: string
  passedAt: Date | null
  callId: number
  proposalState: ProposalsRow['state']
  reviewNumber: string | null
}

const requests = (db: Database) =>
  db('assessment_requests as r')
    .join('instruments as i', 'i.id', 'r.instrument_id')
    .join('proposals as p', 'p.id', 'r.proposal_id')
    .select({
      id: 'r.id',
      proposalId: 'r.proposal_id',
      instrumentId: 'r.instrument_id',
      instrument: 'i.name',
      passedAt: 'r.passed_at',
      callId: 'p.call_id',
      proposalState: 'p.state',
      reviewNumber: 'p.review_number',
    })

/** Requests on instruments, or on all of them, by review number; the newest call first. */
export function requestsOn(
  db: Database,
  instrumentIds: readonly number[] | 'all',
  callId?: number,
): Promise<RequestRow[]> {
  return requests(db)
    .modify((q) => {
      if (instrumentIds !== 'all') void q.whereIn('r.instrument_id', instrumentIds)
      if (callId !== undefined) void q.where('p.call_id', callId)
    })
    .orderBy([{ column: 'p.call_id', order: 'desc' }, { column: 'i.name' }, { column: 'p.review_number' }])
}

export async function findRequest(db: Database, id: number, lock: boolean): Promise<RequestRow | null> {
  if (lock) await db('assessment_requests').where({ id }).forUpdate().first('id')
  const row: RequestRow | undefined = await requests(db).where('r.id', id).first()
  return row ?? null
}

const assessmentOf = (row: AssessmentsRow): Assessment => ({
  id: row.id,
  verdict: row.verdict,
  trueSeconds: row.true_seconds,
  reason: row.reason,
  panelNote: row.panel_note,
  assessedAt: row.created_at,
  supersededAt: row.superseded_at,
})

/** All assessments of a request, the standing one first. */
export async function assessmentHistory(db: Database, requestId: number): Promise<Assessment[]> {
  return (await db('assessments').where({ request_id: requestId }).orderBy('id', 'desc')).map(assessmentOf)
}

/** The standing assessment of each request that has one. */
export async function standingAssessments(
  db: Database,
  requestIds: readonly number[],
): Promise<Map<number, Assessment>> {
  const rows = await db('assessments').whereIn('request_id', requestIds).whereNull('superseded_at')
  return new Map(rows.map((row) => [row.request_id, assessmentOf(row)]))
}

/** Puts a new assessment over the standing one; both are kept. */
export async function supersedeAssessment(
  db: Database,
  given: Omit<Assessment, 'id' | 'assessedAt' | 'supersededAt'> & { requestId: number; personId: number },
): Promise<number> {
  await db('assessments')
    .where({ request_id: given.requestId })
    .whereNull('superseded_at')
    .update({ superseded_at: utcNow(db) })
  const [id = 0] = await db('assessments').insert({
    request_id: given.requestId,
    verdict: given.verdict,
    true_seconds: given.trueSeconds,
    reason: given.reason,
    panel_note: given.panelNote,
    assessed_by: given.personId,
  })
  return id
}

export async function passRequests(db: Database, requestIds: readonly number[]): Promise<void> {
  await db('assessment_requests')
    .whereIn('id', requestIds)
    .whereNull('passed_at')
    .update({ passed_at: utcNow(db) })
}

/** What the instruments said of proposals. The panel reads an assessment once it was passed on (`passedOnly`). */
export async function assessmentsOfProposals(
  db: Database,
  proposalIds: readonly number[],
  passedOnly: boolean,
): Promise<(InstrumentAssessment & { proposalId: number; panelNote: string })[]> {
  return db('assessments as a')
    .join('assessment_requests as r', 'r.id', 'a.request_id')
    .join('instruments as i', 'i.id', 'r.instrument_id')
    .whereIn('r.proposal_id', proposalIds)
    .whereNull('a.superseded_at')
    .modify((q) => {
      if (passedOnly) void q.whereNotNull('r.passed_at')
    })
    .orderBy(['r.proposal_id', 'i.name'])
    .select({
      proposalId: 'r.proposal_id',
      instrumentId: 'r.instrument_id',
      instrument: 'i.name',
      verdict: 'a.verdict',
      trueSeconds: 'a.true_seconds',
      reason: 'a.reason',
      panelNote: 'a.panel_note',
      assessedAt: 'a.created_at',
    })
}
