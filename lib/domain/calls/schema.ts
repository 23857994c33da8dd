import { z } from 'zod'
import { calendarDay } from '../calendarDay'
import { moment } from './moment'

const dateNames = {
  opensAt: 'opening',
  closesAt: 'deadline',
  graceUntil: 'end of the days of grace',
  assessmentsDueAt: 'due date of assessments',
  reviewsDueAt: 'due date of reviews',
  panelMeetsAt: 'panel',
  lettersAt: 'letters',
} as const

const dates = {
  opensAt: moment,
  closesAt: moment,
  graceUntil: moment,
  assessmentsDueAt: moment,
  reviewsDueAt: moment,
  panelMeetsAt: moment,
  lettersAt: moment,
}

type Dates = Record<keyof typeof dateNames, Date>

/** Each date must come after the one it waits for; the sentence names both. */
function inOrder(value: Dates, context: z.RefinementCtx): void {
  const pairs: [keyof Dates, keyof Dates][] = [
    ['opensAt', 'closesAt'],
    ['closesAt', 'graceUntil'],
    ['closesAt', 'assessmentsDueAt'],
    ['closesAt', 'reviewsDueAt'],
    ['reviewsDueAt', 'panelMeetsAt'],
    ['panelMeetsAt', 'lettersAt'],
  ]
  for (const [first, second] of pairs)
    if (value[first] >= value[second])
      context.addIssue({
        code: 'custom',
        path: [second],
        message: `The ${dateNames[second]} must come after the ${dateNames[first]}.`,
      })
}

export const saveDatesSchema = z
  .object({
    slug: z.string().min(1).max(60),
    version: z.number().int().positive(),
    /** Why the deadline moves; wanted where an open call's does. */
    why: z.string().trim().max(500, 'At most 500 characters.'),
    ...dates,
  })
  .superRefine(inOrder)

export const planCallSchema = z
  .object({ from: z.string().min(1).max(60), seasonFrom: calendarDay, seasonTo: calendarDay, ...dates })
  .superRefine(inOrder)
  .superRefine((value, context) => {
    if (value.seasonFrom > value.seasonTo)
      context.addIssue({
        code: 'custom',
        path: ['seasonTo'],
        message: 'The last evening must not come before the first.',
      })
    if (Date.parse(value.seasonTo) - Date.parse(value.seasonFrom) > 400 * 86_400_000)
      context.addIssue({ code: 'custom', path: ['seasonTo'], message: 'A season has at most 400 nights.' })
    if (new Date(value.seasonFrom) < value.lettersAt)
      context.addIssue({
        code: 'custom',
        path: ['seasonFrom'],
        message: 'The first evening must come after the letters.',
      })
  })

export const callStepSchema = z.object({
  slug: z.string().min(1).max(60),
  version: z.number().int().positive(),
})
