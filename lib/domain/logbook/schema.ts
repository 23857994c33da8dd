import { z } from 'zod'

/** One row of the logbook in the office's table. */
export const logbookRow = z.object({
  id: z.number(),
  at: z.iso.datetime(),
  person: z.string().nullable(),
  actingAs: z.string(),
  action: z.string(),
  subject: z.string(),
  before: z.string(),
  after: z.string(),
  address: z.string(),
})

export const logbookReply = z.object({ rows: z.array(logbookRow), hasMore: z.boolean() })
export const logbookQuery = z.object({
  before: z
    .string()
    .regex(/^\d{1,10}$/)
    .optional(),
})

export type LogbookTableRow = z.output<typeof logbookRow>
export type LogbookReply = z.output<typeof logbookReply>
