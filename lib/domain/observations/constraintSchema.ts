import { z } from 'zod'
import { isCalendarDay } from '../calendarDay'
import { typedNumber } from '../targets/typedNumber'
import type { Conditions } from './seasonOf'

const number = (what: string, low: number, high: number, message: string) =>
  typedNumber(what, low, high).transform(({ value }, ctx): number => {
    if (value !== null) return value
    ctx.addIssue({ code: 'custom', message })
    return z.NEVER
  })

const evening = z
  .string()
  .trim()
  .transform((text, ctx): string | null => {
    if (text === '') return null
    if (isCalendarDay(text)) return text
    ctx.addIssue({ code: 'custom', message: 'Write an evening as 2027-07-14.' })
    return z.NEVER
  })

/** The conditions asked for: text as typed in, what is kept out. */
export const constraintSchema = z
  .object({
    name: z
      .string()
      .trim()
      .min(1, 'Give the conditions a name.')
      .max(120, 'A name has at most 120 characters.'),
    maxAirmass: number('An airmass', 1, 3, 'Give the highest airmass you accept.'),
    imageQuality: number('An image', 0.2, 10, 'Give the poorest image you accept.'),
    moon: z.enum(['dark', 'grey', 'any']),
    minMoonSeparation: number('A distance', 0, 120, 'Give the nearest Moon you accept.'),
    transparency: z.enum(['photometric', 'clear', 'thin-cloud']),
    dateFrom: evening,
    dateTo: evening,
    cadence: z
      .string()
      .transform((text) => text.replace(/\s+/g, ' ').trim() || null)
      .refine((text) => text === null || [...text].length <= 120, 'At most 120 characters.'),
  })
  .transform(({ imageQuality, minMoonSeparation, ...rest }): Conditions => ({
    ...rest,
    imageQualityArcsec: imageQuality,
    minMoonSeparationDeg: minMoonSeparation,
  }))
  .superRefine(({ dateFrom, dateTo }, ctx) => {
    if (dateFrom && dateTo && dateTo < dateFrom)
      ctx.addIssue({ code: 'custom', path: ['dateTo'], message: 'The last evening lies before the first.' })
  })

export type ConstraintRow = z.input<typeof constraintSchema>

/** A kept set as the text of its form. */
export function constraintRow(set: Conditions): ConstraintRow {
  return {
    name: set.name,
    maxAirmass: String(set.maxAirmass),
    imageQuality: String(set.imageQualityArcsec),
    moon: set.moon,
    minMoonSeparation: String(set.minMoonSeparationDeg),
    transparency: set.transparency,
    dateFrom: set.dateFrom ?? '',
    dateTo: set.dateTo ?? '',
    cadence: set.cadence ?? '',
  }
}
