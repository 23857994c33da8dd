import { z } from 'zod'
import { isCalendarDay } from '../calendarDay'

/** First evening a version holds for, `2027-03-01`. */
export const firstEvening = z
  .string()
  .trim()
  .regex(/^\d{4}-\d{2}-\d{2}$/, 'Give the first evening as year-month-day.')
  .refine(isCalendarDay, 'There is no such day.')
  .refine((text) => text >= '2000-01-01' && text < '2100-01-01', 'An evening lies between 2000 and 2099.')

/** What every new version of a record says besides its facts. */
export const versionFields = {
  slug: z.string().min(1).max(60),
  /** The newest version when the page was read: somebody else's newer one is not written over unseen. */
  over: z.number().int().positive(),
  validFrom: firstEvening,
}
