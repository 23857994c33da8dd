import type { Database } from '../client.ts'
import { utcNow } from '../utcNow.ts'

/** Approves a prepared decision that still stands at `version`; false when it does not, or is made known. */
export async function approveDecision(
  db: Database,
  decision: { id: number; version: number },
  by: number,
): Promise<boolean> {
  const count = await db('decisions')
    .where({ id: decision.id, version: decision.version })
    .whereNull('released_at')
    .whereNull('superseded_at')
    .update({ approved_by: by, approved_version: decision.version, approved_at: utcNow(db) })
  return count === 1
}

/** Names of people, by key. */
export async function namesOf(db: Database, personIds: readonly number[]): Promise<Map<number, string>> {
  const rows = await db('people').whereIn('id', personIds).select('id', 'name')
  return new Map(rows.map((row) => [row.id, row.name]))
}

/** The panels of a call, in the order they were made. */
export function panelsOfCall(db: Database, callId: number): Promise<{ id: number; name: string }[]> {
  return db('panels').where({ call_id: callId }).orderBy('id').select('id', 'name')
}

/** Keeps that someone has a version of a decision before them; once is enough. */
export async function recordOpening(
  db: Database,
  decision: { id: number; version: number },
  by: number,
): Promise<void> {
  await db('decision_openings')
    .insert({ decision_id: decision.id, version: decision.version, person_id: by })
    .onConflict(['decision_id', 'version', 'person_id'])
    .ignore()
}

/** Which of these decisions someone has opened as they stand, by key. */
export async function openedAsTheyStand(
  db: Database,
  decisionIds: readonly number[],
  by: number,
): Promise<Set<number>> {
  const rows = await db('decision_openings as o')
    .join('decisions as d', (on) => on.on('d.id', 'o.decision_id').on('d.version', 'o.version'))
    .whereIn('d.id', decisionIds)
    .where({ 'o.person_id': by })
    .select<{ id: number }[]>('d.id')
  return new Set(rows.map(({ id }) => id))
}
