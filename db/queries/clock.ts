import type { Database } from '../client.ts'

/** Now, by the database's clock: the only clock that decides a deadline. */
export async function databaseNow(db: Database): Promise<Date> {
  const [rows] = (await db.raw('SELECT UTC_TIMESTAMP(3) AS now_utc')) as [{ now_utc: Date }[]]
  const row = rows[0]
  if (!row) throw new Error('the database gave no time')
  return row.now_utc
}
