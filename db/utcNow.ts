import type { Database } from './client.ts'

// Knex types an expression apart from the column it fills; these are the two that columns of type Date take.

/** The database's clock, as an expression for an insert or update. */
export function utcNow(db: Database): Date {
  return db.raw('UTC_TIMESTAMP(3)') as unknown as Date
}

/** So many seconds from the database's now. */
export function utcIn(db: Database, seconds: number): Date {
  return db.raw('UTC_TIMESTAMP(3) + INTERVAL ? SECOND', [seconds]) as unknown as Date
}
