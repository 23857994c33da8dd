import { z } from 'zod'

/** A moment as the date field gives it: '2027-03-31T22:00:00Z'. */
export const moment = z
  .string()
  .refine((text) => text.length > 0, 'Give a date and a time, in UTC.')
  .refine((text) => text.length === 0 || !Number.isNaN(Date.parse(text)), 'This is not a date we can read.')
  .transform((text) => new Date(text))
