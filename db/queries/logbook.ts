import type { Database } from '../client.ts'
import type { LogbookRow } from '../tables.ts'

/** Locks the end of the chain and returns its hash; held until the transaction ends. */
export async function lockLogbookHead(db: Database): Promise<string> {
  const head = await db('logbook_head').where({ id: 1 }).forUpdate().first()
  if (!head) throw new Error('the logbook has no head row: run the migrations')
  return head.last_hash
}

export async function appendLogbook(db: Database, row: Omit<LogbookRow, 'id'>): Promise<void> {
  await db('logbook').insert(row)
  await db('logbook_head').where({ id: 1 }).update({ last_hash: row.hash })
}

/** All rows in order, a page at a time. */
export function readLogbookPage(db: Database, afterId: number, limit: number): Promise<LogbookRow[]> {
  return db('logbook').where('id', '>', afterId).orderBy('id').limit(limit)
}
