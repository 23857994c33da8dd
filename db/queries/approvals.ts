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
