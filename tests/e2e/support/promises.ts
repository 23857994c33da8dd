import { connect, type Database } from '@/db/client'
import { invariantBreaches } from '@/db/queries/invariants'

let db: Database | null = null

/** The database behind the server under test. */
export function database(): Database {
  const url = process.env.DATABASE_URL
  if (!url) throw new Error('DATABASE_URL is not set: the journeys look into the database as well.')
  db ??= connect(url, { max: 2 })
  return db
}

/** The promises that do not hold as the database stands. */
export const brokenPromises = () => invariantBreaches(database())
