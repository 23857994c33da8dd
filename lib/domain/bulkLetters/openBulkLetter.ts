import type { Database } from '@/db/client'
import { findBulkLetter } from '@/db/queries/bulkLetters'
import { callsToWriteAbout } from '@/db/queries/recipients'
import { refuse } from '@/lib/errors'
import type { LetterCall } from './composeLetter'
import { audienceSchema, type Audience } from './schema'

export interface OpenedBulkLetter {
  id: number
  version: number
  subject: string
  text: string
  audience: Audience
  call: LetterCall | null
  queuedAt: Date | null
  cancelledAt: Date | null
  recipients: number | null
}

/** A letter to many as it is kept, with its call looked up. */
export async function openBulkLetter(db: Database, id: number): Promise<OpenedBulkLetter> {
  const row = await findBulkLetter(db, id)
  if (!row) throw refuse.notFound('letter')
  const audience = audienceSchema.parse(JSON.parse(row.audience))
  const calls = audience.callId ? await callsToWriteAbout(db) : []
  return {
    id: row.id,
    version: row.version,
    subject: row.subject,
    text: row.text_body,
    audience,
    call: calls.find((call) => String(call.id) === audience.callId) ?? null,
    queuedAt: row.queued_at,
    cancelledAt: row.cancelled_at,
    recipients: row.recipients,
  }
}
