import type { Database } from '../client.ts'
import type { StoredObjectsRow } from '../tables.ts'

export interface NewStoredObject {
  key: string
  sha256: string
  sizeBytes: number
  contentType: string
  purpose: StoredObjectsRow['purpose']
}

/** Notes an object that has been put into the store; written after the put, so that no row points at nothing. */
export async function insertStoredObject(db: Database, given: NewStoredObject): Promise<number> {
  const [id] = await db('stored_objects').insert({
    object_key: given.key,
    sha256: given.sha256,
    size_bytes: given.sizeBytes,
    content_type: given.contentType,
    purpose: given.purpose,
  })
  return Number(id)
}

/** Which of these keys have a row. */
export async function knownKeys(db: Database, keys: readonly string[]): Promise<Set<string>> {
  const rows = await db('stored_objects').whereIn('object_key', keys).select('object_key')
  return new Set(rows.map((row) => row.object_key))
}
