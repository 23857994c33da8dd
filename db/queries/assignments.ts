import type { Database } from '../client.ts'
import type { AssignmentsRow } from '../tables.ts'

export interface PanelAssignment {
  id: number
  proposalId: number
  personId: number
  seat: AssignmentsRow['seat']
  assignedAt: Date
  finishedAt: Date | null
  begun: boolean
}

/** Standing assignments of a panel, with whether anything has been scored or written. */
export async function panelAssignments(db: Database, panelId: number): Promise<PanelAssignment[]> {
  const rows = await db('assignments as a')
    .where('a.panel_id', panelId)
    .whereNull('a.withdrawn_at')
    .orderBy(['a.proposal_id', 'a.id'])
    .select<(Omit<PanelAssignment, 'begun'> & { begun: number })[]>(
      {
        id: 'a.id',
        proposalId: 'a.proposal_id',
        personId: 'a.person_id',
        seat: 'a.seat',
        assignedAt: 'a.assigned_at',
        finishedAt: 'a.finished_at',
      },
      db.raw(
        'EXISTS (SELECT 1 FROM score_events s WHERE s.assignment_id = a.id) OR EXISTS (SELECT 1 FROM review_texts x WHERE x.assignment_id = a.id) AS begun',
      ),
    )
  return rows.map((row) => ({ ...row, begun: Boolean(Number(row.begun)) }))
}

/**
 * Gives a proposal to a reviewer; one taken back before is given anew, with what was written still there.
 * `isUndo` when it had been taken back less than a minute ago.
 */
export async function giveAssignment(
  db: Database,
  given: { proposalId: number; personId: number; panelId: number; seat: AssignmentsRow['seat']; by: number },
): Promise<{ id: number; isUndo: boolean }> {
  const now = db.raw('UTC_TIMESTAMP(3)') as unknown as Date
  const pair = { proposal_id: given.proposalId, person_id: given.personId }
  const row = { panel_id: given.panelId, seat: given.seat, assigned_by: given.by, assigned_at: now }
  const before = await db('assignments')
    .where(pair)
    .forUpdate()
    .first<{ id: number; recent: number | null } | undefined>(
      'id',
      db.raw('withdrawn_at > UTC_TIMESTAMP(3) - INTERVAL 1 MINUTE AS recent'),
    )
  if (!before) {
    const [id] = await db('assignments').insert({ ...pair, ...row })
    return { id: Number(id), isUndo: false }
  }
  await db('assignments')
    .where({ id: before.id })
    .whereNotNull('withdrawn_at')
    .update({
      ...row,
      withdrawn_at: null,
      withdrawn_reason: null,
      version: db.raw('version + 1') as unknown as number,
    })
  return { id: before.id, isUndo: Number(before.recent) === 1 }
}

/** Takes an unfinished assignment back; false when it is finished or gone. */
export async function takeAssignmentBack(db: Database, id: number, reason: string): Promise<boolean> {
  const count = await db('assignments')
    .where({ id })
    .whereNull('withdrawn_at')
    .whereNull('finished_at')
    .update({
      withdrawn_at: db.raw('UTC_TIMESTAMP(3)') as unknown as Date,
      withdrawn_reason: reason,
      version: db.raw('version + 1') as unknown as number,
    })
  return count === 1
}

export async function setSeat(db: Database, id: number, seat: AssignmentsRow['seat']): Promise<void> {
  await db('assignments')
    .where({ id })
    .update({ seat, version: db.raw('version + 1') as unknown as number })
}

/** Pages of the justification sent, by proposal: what a reviewer has to read. A page set by us holds some 3,600 characters. */
export async function pagesToRead(
  db: Database,
  proposalIds: readonly number[],
): Promise<Map<number, number>> {
  const rows = await db('proposal_versions as v')
    .leftJoin('papers as a', 'a.id', 'v.paper_id')
    .whereIn('v.proposal_id', proposalIds)
    .whereNull('v.superseded_at')
    .select<{ proposalId: number; pages: number }[]>(
      'v.proposal_id as proposalId',
      db.raw(
        `COALESCE(a.pages, CEIL(CHAR_LENGTH(JSON_VALUE(v.snapshot, '$.contents.writings.justification.text')) / 3600), 1) AS pages`,
      ),
    )
  return new Map(rows.map((row) => [row.proposalId, Number(row.pages)]))
}

/** When each reviewer of a panel went through the list of names, for those who have. */
export async function declarationsIn(db: Database, callId: number): Promise<Set<number>> {
  const rows = await db('interest_declarations').where({ call_id: callId }).select('person_id')
  return new Set(rows.map((row) => row.person_id))
}

/** When each reviewer was last reminded by the panel. */
export async function lastReminders(db: Database, panelId: number): Promise<Map<number, Date>> {
  const rows = await db('outbox')
    .where('template', 'review-reminder')
    .andWhere('dedupe_key', 'like', `remind:${panelId}:%`)
    .whereNotNull('person_id')
    .groupBy('person_id')
    .select('person_id')
    .max<{ person_id: number; at: Date }[]>({ at: 'created_at' })
  return new Map(rows.map((row) => [row.person_id, row.at]))
}

/** Proposals of a call that were sent go under review; a reopened one is judged as it was last sent. */
export async function putUnderReview(db: Database, callId: number): Promise<number> {
  return db('proposals')
    .where({ call_id: callId, state: 'submitted' })
    .update({
      state: 'under-review',
      is_reopened: 0,
      version: db.raw('version + 1') as unknown as number,
      updated_at: db.raw('UTC_TIMESTAMP(3)') as unknown as Date,
    })
}

/** Moves a call from one stage to the next if it still stands at the first. */
export async function moveStage(
  db: Database,
  callId: number,
  from: 'published' | 'review' | 'ranking',
  to: 'review' | 'ranking' | 'decided',
): Promise<boolean> {
  const count = await db('calls')
    .where({ id: callId, stage: from })
    .update({ stage: to, version: db.raw('version + 1') as unknown as number })
  return count === 1
}
