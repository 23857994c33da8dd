import type { Database } from '../client.ts'
import { atNow } from './clock.ts'
import type { ProposalsRow } from '../tables.ts'

/** Review numbers of a call already given. */
export async function takenReviewNumbers(db: Database, callId: number): Promise<string[]> {
  const rows = await db('proposals')
    .where({ call_id: callId })
    .whereNotNull('review_number')
    .select('review_number')
  return rows.flatMap((row) => row.review_number ?? [])
}

/**
 * Marks a proposal as sent, if nothing about it has moved: same version, still being written, and its
 * deadline after the stamp of arrival. False when any of these no longer holds.
 */
export async function markSubmitted(
  db: Database,
  row: Pick<ProposalsRow, 'id' | 'version'>,
  sent: { reviewNumber: string; panelId: number; arrivedAt: Date },
): Promise<boolean> {
  const count = await db('proposals')
    .where({ id: row.id, version: row.version })
    .andWhere((q) => q.where({ state: 'draft' }).orWhere({ state: 'submitted', is_reopened: 1 }))
    .andWhereRaw(
      `? < COALESCE(closes_at, (SELECT k.closes_at FROM call_kinds k WHERE k.id = call_kind_id),
                    (SELECT c.closes_at FROM calls c WHERE c.id = call_id))`,
      [sent.arrivedAt],
    )
    .update({
      state: 'submitted',
      is_reopened: 0,
      review_number: sent.reviewNumber,
      panel_id: sent.panelId,
      version: row.version + 1,
      updated_at: atNow(db),
    })
  return count === 1
}

/** Opens a sent proposal for writing again; the version that was sent stands. */
export async function markReopened(
  db: Database,
  row: Pick<ProposalsRow, 'id' | 'version'>,
): Promise<boolean> {
  const count = await db('proposals')
    .where({ id: row.id, version: row.version, state: 'submitted', is_reopened: 0 })
    .update({ is_reopened: 1, version: row.version + 1, updated_at: atNow(db) })
  return count === 1
}

/** Takes a proposal out of the running, for good. */
export async function markOut(
  db: Database,
  row: Pick<ProposalsRow, 'id' | 'version'>,
  out: { state: 'withdrawn'; reason: string } | { state: 'lapsed' },
): Promise<boolean> {
  const count = await db('proposals')
    .where({ id: row.id, version: row.version })
    .update({
      state: out.state,
      is_reopened: 0,
      ...(out.state === 'withdrawn' ? { withdrawn_at: atNow(db), withdrawn_reason: out.reason } : {}),
      version: row.version + 1,
      updated_at: atNow(db),
    })
  return count === 1
}

/** One request for each instrument used; those of instruments given up go, unless someone has spoken on them. */
export async function setAssessmentRequests(
  db: Database,
  proposalId: number,
  instrumentIds: readonly number[],
): Promise<void> {
  const givenUp = await db('assessment_requests')
    .where({ proposal_id: proposalId })
    .whereNotIn('instrument_id', [...instrumentIds])
    .whereNotExists(db('assessments').select('id').whereRaw('request_id = assessment_requests.id'))
    .whereNotExists(db('assessment_questions').select('id').whereRaw('request_id = assessment_requests.id'))
    .pluck('id')
  // A delete that finds nothing would lock the gap that parallel first sends insert into.
  if (givenUp.length > 0) await db('assessment_requests').whereIn('id', givenUp).delete()
  const rows = instrumentIds.map((instrument_id) => ({ proposal_id: proposalId, instrument_id }))
  if (rows.length > 0)
    await db('assessment_requests').insert(rows).onConflict(['proposal_id', 'instrument_id']).ignore()
}
