import { z } from 'zod'

/** Whether a day of the calendar is written as 2027-07-01. 30 February is none, though `Date` reads it as 2 March. */
export const isCalendarDay = (text: string): boolean => z.iso.date().safeParse(text).success

/** A day as date fields send it. */
export const calendarDay = z
  .string()
  .regex(/^\d{4}-\d{2}-\d{2}$/, 'Give a date as year-month-day.')
  .refine(isCalendarDay, 'There is no such day.')
