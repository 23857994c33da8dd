import type { Database } from '../client.ts'
import { utcNow } from '../utcNow.ts'

export interface LogbookCheck {
  checkedAt: Date
  /** Who asked for it; null for the clock. */
  checkedBy: string | null
  rowsChecked: number
  fault: string | null
}

export async function insertCheck(
  db: Database,
  check: { checkedBy: number | null; rowsChecked: number; fault: string | null },
): Promise<void> {
  await db('logbook_checks').insert({
    checked_at: utcNow(db),
    checked_by: check.checkedBy,
    rows_checked: check.rowsChecked,
    fault: check.fault,
  })
}

/** The last time the chain was computed anew; null when it never was. */
export async function lastCheck(db: Database): Promise<LogbookCheck | null> {
  const row = await db('logbook_checks as k')
    .leftJoin('people as p', 'p.id', 'k.checked_by')
    .orderBy('k.id', 'desc')
    .first<LogbookCheck | undefined>({
      checkedAt: 'k.checked_at',
      checkedBy: 'p.name',
      rowsChecked: 'k.rows_checked',
      fault: 'k.fault',
    })
  return row ?? null
}

/** Whether the last check is so many seconds old, by the database's clock, or there was none. */
export async function isCheckDue(db: Database, seconds: number): Promise<boolean> {
  const recent = await db('logbook_checks')
    .where('checked_at', '>', db.raw('UTC_TIMESTAMP(3) - INTERVAL ? SECOND', [seconds]))
    .first('id')
  return recent === undefined
}
