import type { Database } from '@/db/client'
import { databaseNow } from '@/db/queries/clock'

/** The moment a request reached us, by the database's clock. Called before anything else is done for it. */
export function stampArrival(db: Database): Promise<Date> {
  return databaseNow(db)
}
