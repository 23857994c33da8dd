import { appendLogbook, lockLogbookHead } from '@/db/queries/logbook'
import { databaseNow } from '@/db/queries/clock'
import type { Context } from '../context'
import type { Role } from '../actor'
import { entryHash } from './entryHash'

export interface LogbookEntry {
  action: string
  subject: { kind: string; id: string | number }
  actingAs: Role | 'visitor' | 'clock' | 'payment firm'
  before?: unknown
  after?: unknown
}

/**
 * Adds a row to the logbook in the caller's transaction. It takes the lock on the chain's end,
 * so write it last: the shorter it is held, the less others wait.
 */
export async function writeLogbook(tx: Context, entry: LogbookEntry): Promise<void> {
  const at = await databaseNow(tx.db)
  const row = {
    at,
    person_id: tx.actor?.personId ?? null,
    acting_as: entry.actingAs,
    action: entry.action,
    subject_kind: entry.subject.kind,
    subject_id: String(entry.subject.id),
    before_value: entry.before === undefined ? null : JSON.stringify(entry.before),
    after_value: entry.after === undefined ? null : JSON.stringify(entry.after),
    request_id: tx.request.id,
    address: tx.request.address,
  }
  const previous_hash = await lockLogbookHead(tx.db)
  await appendLogbook(tx.db, { ...row, previous_hash, hash: entryHash(row, previous_hash) })
}
