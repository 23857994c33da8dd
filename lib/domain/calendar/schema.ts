import { z } from 'zod'
import { calendarDay } from '../calendarDay'
import { nightUses } from '../calls/nightUseList'

const onCall = { slug: z.string().min(1).max(60), version: z.number().int().positive() }

const fraction = z
  .string()
  .trim()
  .regex(/^(0|1|0?\.\d{1,3}|1\.0{1,3})$/, 'A fraction of the night from 0 to 1, with at most three decimals.')
  .transform(Number)

const part = z.object({
  from: fraction,
  to: fraction,
  useFor: z.enum(nightUses, 'Say what it is for.'),
  instrumentId: z
    .string()
    .regex(/^\d{0,9}$/, 'Choose one of the list.')
    .transform((text) => (text === '' ? null : Number(text))),
  note: z
    .string()
    .transform((text) => text.replace(/\s+/g, ' ').trim())
    .refine((text) => [...text].length <= 120, 'At most 120 characters.'),
})

/** What the nights from one evening to another are for, all alike. */
export const setNightsSchema = z.object({
  ...onCall,
  telescopeId: z.number().int().positive(),
  from: calendarDay,
  to: calendarDay,
  parts: z.array(part).max(12, 'A night has at most twelve parts.'),
  /** Those it was promised to agree that it is taken. */
  mayTakePromised: z.boolean(),
})

export const importNightsSchema = z.object({
  ...onCall,
  text: z.string().max(2_000_000, 'The file is larger than 2 MB.'),
  mayTakePromised: z.boolean(),
})
