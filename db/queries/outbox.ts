import type { Database } from '../client.ts'
import type { OutboxRow } from '../tables.ts'
import { utcIn, utcNow } from '../utcNow.ts'

export interface NewLetter {
  dedupeKey: string
  messageId: string
  template: string
  personId: number | null
  toEmail: string
  toName: string
  subject: string
  text: string
  html: string
  /** The letter to many it belongs to. */
  bulkLetterId?: number
  /** The letter it repeats. */
  againOf?: number
  /** Number of an invoice or credit note. */
  attachment: string | null
}

/** Adds a letter; the same cause and person a second time is the same letter, and nothing happens. */
export async function insertLetter(db: Database, letter: NewLetter): Promise<void> {
  await db('outbox')
    .insert({
      dedupe_key: letter.dedupeKey,
      message_id: letter.messageId,
      template: letter.template,
      person_id: letter.personId,
      to_email: letter.toEmail,
      to_name: letter.toName,
      subject: letter.subject,
      text_body: letter.text,
      html_body: letter.html,
      bulk_letter_id: letter.bulkLetterId ?? null,
      again_of: letter.againOf ?? null,
      attachment: letter.attachment,
      next_attempt_at: utcNow(db),
    })
    .onConflict('dedupe_key')
    .ignore()
}

/** Whether a letter of this cause has been written to anybody. */
export async function isCausePosted(db: Database, cause: string): Promise<boolean> {
  return (await db('outbox').where('dedupe_key', 'like', `${cause}:%`).first('id')) !== undefined
}

/** Takes up to `limit` letters that are due, so that no second relay sends them; a dead relay's come back. */
export async function claimLetters(db: Database, limit: number, holdSeconds: number): Promise<OutboxRow[]> {
  return db.transaction(async (trx) => {
    const due = await trx('outbox')
      .whereIn('state', ['queued', 'sending'])
      .andWhere('next_attempt_at', '<=', trx.raw('UTC_TIMESTAMP(3)'))
      .andWhere((q) =>
        q.whereNull('claimed_until').orWhere('claimed_until', '<', trx.raw('UTC_TIMESTAMP(3)')),
      )
      .orderBy('id')
      .limit(limit)
      .forUpdate()
      .skipLocked()
    if (due.length > 0)
      await trx('outbox')
        .whereIn(
          'id',
          due.map((row) => row.id),
        )
        .update({
          state: 'sending',
          claimed_until: utcIn(trx, holdSeconds),
        })
    return due
  })
}

/** What is left of a letter whose reader is forgotten. */
const forgotten = {
  to_email: 'erased@erased.invalid',
  to_name: 'Erased person',
  subject: 'To an erased person',
  text_body: '',
  html_body: '',
}

/** `forget`: blots out at once whom it went to and what it said. */
export async function markSent(db: Database, id: number, forget = false): Promise<void> {
  await db('outbox')
    .where({ id })
    .update({
      state: 'sent',
      sent_at: utcNow(db),
      attempts: db.raw('attempts + 1') as unknown as number,
      claimed_until: null,
      last_error: null,
      ...(forget ? forgotten : {}),
    })
}

/** Gives a letter up that cannot go, and blots out whom it was for and what it said. */
export async function giveUpAndForget(db: Database, id: number): Promise<void> {
  await db('outbox')
    .where({ id })
    .update({
      state: 'cancelled',
      attempts: db.raw('attempts + 1') as unknown as number,
      claimed_until: null,
      last_error: null,
      ...forgotten,
    })
}

/** Puts a letter back for a later try, parks it, or keeps that its address was refused. */
export async function markFailed(
  db: Database,
  id: number,
  outcome: { error: string; waitSeconds: number; state: 'queued' | 'parked' | 'bounced' },
): Promise<void> {
  await db('outbox')
    .where({ id })
    .update({
      state: outcome.state,
      attempts: db.raw('attempts + 1') as unknown as number,
      claimed_until: null,
      last_error: outcome.error.slice(0, 300),
      next_attempt_at: utcIn(db, outcome.waitSeconds),
    })
}

/** The letter that was sent under one of these Message-IDs, locked. */
export async function lockLetterOf(db: Database, messageIds: readonly string[]): Promise<OutboxRow | null> {
  if (messageIds.length === 0) return null
  return (
    (await db('outbox')
      .whereIn('message_id', [...messageIds])
      .forUpdate()
      .first()) ?? null
  )
}

/** Keeps what a mail server said of a letter after it had taken it, and what becomes of the letter. */
export async function markReported(
  db: Database,
  id: number,
  outcome: { said: string; state: 'sent' | 'parked' | 'bounced' },
): Promise<void> {
  await db('outbox').where({ id }).update({ state: outcome.state, last_error: outcome.said })
}

/** Letters, the newest first, without their texts. */
export function listLetters(
  db: Database,
  limit: number,
): Promise<Omit<OutboxRow, 'text_body' | 'html_body'>[]> {
  return db('outbox')
    .orderBy('id', 'desc')
    .limit(limit)
    .select(
      'id',
      'dedupe_key',
      'message_id',
      'template',
      'person_id',
      'to_email',
      'to_name',
      'subject',
      'state',
      'attempts',
      'next_attempt_at',
      'claimed_until',
      'last_error',
      'bulk_letter_id',
      'again_of',
      'sent_at',
      'created_at',
    )
}

export async function findLetter(db: Database, id: number): Promise<OutboxRow | null> {
  return (await db('outbox').where({ id }).first()) ?? null
}

/** How often a letter was sent once more. */
export async function timesRepeated(db: Database, id: number): Promise<number> {
  const [row] = await db('outbox').where({ again_of: id }).count<{ n: string }[]>({ n: '*' })
  return Number(row?.n ?? 0)
}

/** Puts a letter that was not taken at the head of the queue; false when it was, is being sent, or was stopped. */
export async function requeueLetter(db: Database, id: number): Promise<boolean> {
  const changed = await db('outbox')
    .where({ id })
    .whereIn('state', ['queued', 'parked', 'bounced'])
    .update({ state: 'queued', attempts: 0, next_attempt_at: utcNow(db), claimed_until: null })
  return changed === 1
}

/** The newest letter of each template that was ever written. */
export async function newestByTemplate(db: Database): Promise<{ template: string; id: number }[]> {
  const rows = await db('outbox').groupBy('template').orderBy('template').select('template').max({ id: 'id' })
  return rows.map((row) => ({ template: row.template, id: Number(row.id) }))
}
