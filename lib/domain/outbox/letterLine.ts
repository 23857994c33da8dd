import type { listLetters } from '@/db/queries/outbox'
import type { LetterRow } from './schema'

type Row = Awaited<ReturnType<typeof listLetters>>[number]

/** A row of the outbox as the office's table has it. */
export const letterLine = (row: Row): LetterRow => ({
  id: row.id,
  template: row.template,
  toName: row.to_name,
  toEmail: row.to_email,
  subject: row.subject,
  state: row.state,
  attempts: row.attempts,
  lastError: row.last_error,
  createdAt: row.created_at.toISOString(),
  sentAt: row.sent_at?.toISOString() ?? null,
})
