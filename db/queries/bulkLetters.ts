import type { Database } from '../client.ts'
import type { BulkLettersRow } from '../tables.ts'
import { utcNow } from '../utcNow.ts'

export interface BulkLetterFacts {
  subject: string
  text: string
  audience: string
}

export async function insertBulkLetter(
  db: Database,
  letter: BulkLetterFacts & { writtenBy: number },
): Promise<number> {
  const [id] = await db('bulk_letters').insert({
    subject: letter.subject,
    text_body: letter.text,
    audience: letter.audience,
    written_by: letter.writtenBy,
  })
  return id as number
}

/** Saves a draft read at `version`; false when it was saved or sent in between. */
export async function updateBulkLetter(
  db: Database,
  id: number,
  version: number,
  letter: BulkLetterFacts,
): Promise<boolean> {
  const changed = await db('bulk_letters')
    .where({ id, version })
    .whereNull('queued_at')
    .update({
      subject: letter.subject,
      text_body: letter.text,
      audience: letter.audience,
      version: version + 1,
    })
  return changed === 1
}

export async function findBulkLetter(db: Database, id: number): Promise<BulkLettersRow | null> {
  return (await db('bulk_letters').where({ id }).first()) ?? null
}

/** Takes a draft to be sent; false when someone took or changed it first. */
export async function takeBulkLetter(
  db: Database,
  id: number,
  version: number,
  recipients: number,
): Promise<boolean> {
  const changed = await db('bulk_letters')
    .where({ id, version })
    .whereNull('queued_at')
    .update({ queued_at: utcNow(db), recipients, version: version + 1 })
  return changed === 1
}

/** Stops what has not been sent; returns how many letters. One that is being sent this moment goes. */
export async function stopBulkLetter(db: Database, id: number): Promise<number> {
  const stopped = await db('outbox')
    .where({ bulk_letter_id: id })
    .whereIn('state', ['queued', 'parked', 'bounced'])
    .update({ state: 'cancelled' })
  if (stopped > 0)
    await db('bulk_letters')
      .where({ id })
      .update({ cancelled_at: utcNow(db) })
  return stopped
}

/** Letters of one letter to many, by state. */
export async function bulkStates(db: Database, id: number): Promise<ReadonlyMap<string, number>> {
  const rows = await db('outbox')
    .where({ bulk_letter_id: id })
    .groupBy('state')
    .select('state')
    .count<{ state: string; n: string | number }[]>({ n: '*' })
  return new Map(rows.map((row) => [row.state, Number(row.n)]))
}

export interface BulkLetterLine {
  id: number
  subject: string
  writtenBy: string | null
  createdAt: Date
  queuedAt: Date | null
  cancelledAt: Date | null
  recipients: number | null
  sent: number
}

/** Letters to many, the newest first. */
export async function listBulkLetters(db: Database, limit: number): Promise<BulkLetterLine[]> {
  const rows = await db('bulk_letters as b')
    .leftJoin('people as p', 'p.id', 'b.written_by')
    .orderBy('b.id', 'desc')
    .limit(limit)
    .select<(Omit<BulkLetterLine, 'sent'> & { sent: string | number })[]>({
      id: 'b.id',
      subject: 'b.subject',
      writtenBy: 'p.name',
      createdAt: 'b.created_at',
      queuedAt: 'b.queued_at',
      cancelledAt: 'b.cancelled_at',
      recipients: 'b.recipients',
      sent: db('outbox')
        .where('bulk_letter_id', db.ref('b.id'))
        .where('state', 'sent')
        .count('*') as unknown as string,
    })
  return rows.map((row) => ({ ...row, sent: Number(row.sent) }))
}
