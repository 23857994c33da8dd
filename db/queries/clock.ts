import type { Database } from '../client.ts'
import { utcNow } from '../utcNow.ts'

/** Now, by the database's clock: the only clock that decides a deadline. */
export async function databaseNow(db: Database): Promise<Date> {
  const [rows] = (await db.raw('SELECT UTC_TIMESTAMP(3) AS now_utc')) as [{ now_utc: Date }[]]
  const row = rows[0]
  if (!row) throw new Error('the database gave no time')
  return row.now_utc
}

/** The same moment as a value to write: Knex's types know no expression in place of a column's value. */
export const atNow = (db: Database): Date => utcNow(db)
