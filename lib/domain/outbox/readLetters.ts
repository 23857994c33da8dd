import { listLetters } from '@/db/queries/outbox'
import { authorize } from '@/lib/auth/authorize'
import type { ActingContext } from '../context'
import { mayReadOutbox } from './policy'
import type { LettersReply } from './schema'

const most = 1000

/** The last thousand letters with their state. */
export async function readLetters(ctx: ActingContext): Promise<LettersReply> {
  authorize(mayReadOutbox(ctx.actor))
  const rows = await listLetters(ctx.db, most)
  return {
    rows: rows.map((row) => ({
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
    })),
  }
}
