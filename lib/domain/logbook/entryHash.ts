import { createHash } from 'node:crypto'

export interface HashedEntry {
  at: Date
  person_id: number | null
  acting_as: string
  action: string
  subject_kind: string
  subject_id: string
  before_value: string | null
  after_value: string | null
  request_id: string
  address: string
}

/** SHA-256 over the entry and the hash before it: changing any row breaks every later one. */
export function entryHash(entry: HashedEntry, previousHash: string): string {
  const parts = [
    previousHash,
    entry.at.toISOString(),
    entry.person_id,
    entry.acting_as,
    entry.action,
    entry.subject_kind,
    entry.subject_id,
    entry.before_value,
    entry.after_value,
    entry.request_id,
    entry.address,
  ]
  return createHash('sha256').update(JSON.stringify(parts)).digest('hex')
}
