import { z } from 'zod'
import { mostTargets } from '../targets/limits'
import { maxFigures } from '../writings/limits'
import { kindKeys } from './kindKeyList'
import { moment } from './moment'
import { typedWhole, typedWholeOrNone } from './typedWhole'

const onCall = { slug: z.string().min(1).max(60), version: z.number().int().positive() }
const key = z
  .string()
  .regex(/^\d{1,9}$/, 'Choose one of the list.')
  .transform(Number)
const line = (sentence: string, most: number) =>
  z
    .string()
    .transform((text) => text.replace(/\s+/g, ' ').trim())
    .refine((text) => text !== '', sentence)
    .refine((text) => [...text].length <= most, `At most ${most} characters.`)

/** A kind as typed; hours with decimals, an empty limit is none. */
export const saveKindSchema = z.object({
  ...onCall,
  /** Null for a new one. */
  kindId: z.number().int().positive().nullable(),
  kind: z.enum(kindKeys, 'Choose what it is.'),
  title: line('Give it a title.', 120),
  closesAt: z.union([z.literal('').transform(() => null), moment]),
  pageLimit: typedWhole('Pages', 1, 60),
  wordLimit: typedWhole('Words', 100, 60_000),
  figureLimit: typedWholeOrNone('Figures', 0, maxFigures),
  abstractLimit: typedWhole('Characters', 100, 10_000),
  maxHours: z
    .string()
    .trim()
    .refine(
      (text) => text === '' || (/^\d{1,4}(\.\d)?$/.test(text) && Number(text) > 0),
      'Hours are a number above 0, with at most one decimal.',
    )
    .transform((text) => (text === '' ? null : Number(text))),
  panelId: key,
  /** Must name a student and a supervisor who have agreed. */
  needsStudent: z.boolean(),
  targetLimit: typedWholeOrNone('Targets', 1, mostTargets),
  /** May ask for what is awaited and has no position yet. */
  takesAwaited: z.boolean(),
  /** Must say how often, and by when, each observation is wanted. */
  needsCadence: z.boolean(),
  needsLastNight: z.boolean(),
})

export const removeKindSchema = z.object({ ...onCall, kindId: z.number().int().positive() })

export const savePanelSchema = z.object({
  ...onCall,
  panelId: z.number().int().positive().nullable(),
  name: line('Give it a name.', 120),
  quorum: typedWhole('A quorum', 1, 30),
})

export const removePanelSchema = z.object({ ...onCall, panelId: z.number().int().positive() })

export const saveCriteriaSchema = z.object({
  ...onCall,
  criteria: z
    .array(
      z.object({
        title: line('Name the criterion.', 120),
        prompt: line('Ask the reviewer something.', 240),
        weight: typedWhole('A weight', 1, 100),
      }),
    )
    .min(1, 'A call has one criterion at least.')
    .max(12, 'At most twelve criteria.'),
})
