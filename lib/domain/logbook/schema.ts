import { z } from 'zod'
import { isCalendarDay } from '../calendarDay'

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

const short = z.string().trim().max(80, 'At most 80 characters can be looked for.').optional()
const day = z
  .string()
  .trim()
  .refine((text) => text === '' || isCalendarDay(text), 'A day is written as 2027-03-31.')
  .optional()

/** What narrows the logbook: everything optional, an empty text is nothing. */
export const logbookFilter = z.object({
  who: short,
  person: z
    .string()
    .regex(/^\d{0,10}$/, 'A person is given by a number.')
    .optional(),
  action: short,
  kind: short,
  id: short,
  from: short,
  since: day,
  until: day,
})

export const logbookQuery = logbookFilter.extend({
  before: z
    .string()
    .regex(/^\d{1,10}$/)
    .optional(),
})

export type LogbookFilterInput = z.output<typeof logbookFilter>
export type LogbookTableRow = z.output<typeof logbookRow>
export type LogbookReply = z.output<typeof logbookReply>
