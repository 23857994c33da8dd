import { z } from 'zod'

const instant = z.iso.datetime()

/** One letter in the office's table; its text is not part of it. */
export const letterRow = z.object({
  id: z.number(),
  template: z.string(),
  toName: z.string(),
  toEmail: z.string(),
  subject: z.string(),
  state: z.enum(['queued', 'sending', 'sent', 'parked', 'bounced', 'cancelled']),
  attempts: z.number(),
  lastError: z.string().nullable(),
  createdAt: instant,
  sentAt: instant.nullable(),
})

export const lettersReply = z.object({ rows: z.array(letterRow) })
export const letterStepSchema = z.object({ letterId: z.number().int().positive() })

export type LetterRow = z.output<typeof letterRow>
export type LettersReply = z.output<typeof lettersReply>
