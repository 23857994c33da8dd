import { z } from 'zod'
import { formatNumber } from '@/lib/format'
import { categories } from './categories'
import { cleanText } from './cleanText'

/** The public reference as it stands in the address; whether there is such a proposal is for the verb to say. */
export const reference = z.string().max(10)
export const version = z.number().int().positive()

const oneLine = (text: string) => cleanText(text).replace(/\s+/g, ' ').trim()
const length = (text: string) => [...text].length

const title = z
  .string()
  .transform(oneLine)
  .refine((text) => length(text) <= 200, 'A title has at most 200 characters.')

export const beginSchema = z.object({
  kindId: z
    .string()
    .regex(/^\d{1,9}$/, 'Choose what kind of proposal it is.')
    .transform(Number),
  title: title.refine((text) => text !== '', 'Give it a title; it can be changed later.'),
})

/** The question, for a kind that takes so many characters of abstract. An empty field is kept as empty. */
export function questionSchema(abstractLimit: number) {
  return z.object({
    title,
    abstract: z
      .string()
      .max(60_000, 'This is far longer than an abstract.')
      .transform((text) => cleanText(text).trimEnd())
      .refine(
        (text) => length(text) <= abstractLimit,
        `An abstract has at most ${formatNumber(abstractLimit)} characters in this call.`,
      ),
    category: z.union([z.literal(''), z.enum(categories, 'Choose a category from the list.')]),
  })
}

/** The same before the kind is known: the verb looks at the limit of the kind once more. */
export const saveQuestionSchema = questionSchema(20_000).extend({ reference, version })

export const sections = [
  'question',
  'targets',
  'cosmology',
  'observing',
  'feasibility',
  'people',
  'papers',
] as const

export const sectionDoneSchema = z.object({
  reference,
  section: z.enum(sections),
  done: z.boolean(),
})

export const referenceSchema = z.object({ reference })
