import type { Database } from '@/db/client'
import { databaseNow } from '@/db/queries/clock'
import { knownKeys } from '@/db/queries/storedObjects'
import { objectKeyMadeAt } from '@/lib/domain/objects/objectKey'
import type { ObjectStore } from '@/lib/services/storage/ObjectStore'

const hour = 3_600_000
const atOnce = 500

/**
 * Removes objects that have no row: an upload whose transaction was lost. Those younger than an hour are left,
 * since their row may still be on its way; keys that are not made by us are never touched. Returns how many went.
 */
export async function sweepObjects(db: Database, storage: ObjectStore): Promise<number> {
  const now = await databaseNow(db)
  const old = (await storage.list('')).filter((key) => {
    const madeAt = objectKeyMadeAt(key)
    return madeAt !== null && now.getTime() - madeAt.getTime() > hour
  })
  let removed = 0
  for (let from = 0; from < old.length; from += atOnce) {
    const keys = old.slice(from, from + atOnce)
    const known = await knownKeys(db, keys)
    for (const key of keys.filter((one) => !known.has(one))) {
      await storage.remove(key)
      removed += 1
    }
  }
  return removed
}
