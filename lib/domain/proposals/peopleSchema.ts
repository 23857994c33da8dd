import { z } from 'zod'
import { orcid } from '../people/orcid'
import { cleanText } from './cleanText'
import { reference } from './schema'

const oneLine = (longest: number, sentence: string) =>
  z
    .string()
    .transform((text) => cleanText(text).replace(/\s+/g, ' ').trim())
    .refine((text) => text.length <= longest, sentence)

const access = z.enum(['read', 'edit', 'deputy'], 'Choose what this person may do.')
const institute = oneLine(200, 'An institute has at most 200 characters.')
const id = z.number().int().positive()

/** Someone to be named. Text stays text in the form; a box is a box. */
export const newInvestigatorSchema = z.object({
  name: oneLine(160, 'A name has at most 160 characters.').refine(
    (text) => text !== '',
    'Give the name as it is to be printed.',
  ),
  email: z
    .string()
    .trim()
    .max(254, 'An address has at most 254 characters.')
    .refine((text) => text !== '', 'Give an e-mail address: the invitation goes there.')
    .refine(
      (text) => text === '' || z.email().safeParse(text).success,
      'This does not read as an e-mail address: name@institute.org.',
    ),
  institute,
  access,
  orcid,
  isStudent: z.boolean(),
  isSupervisor: z.boolean(),
})

/** What can be said of someone named already. */
export const investigatorDetailsSchema = z.object({
  institute,
  orcid,
  isStudent: z.boolean(),
  isSupervisor: z.boolean(),
})

export const addInvestigatorSchema = newInvestigatorSchema.extend({ reference })
export const describeInvestigatorSchema = investigatorDetailsSchema.extend({
  reference,
  id,
  version: z.number().int().positive(),
})
export const investigatorSchema = z.object({ reference, id })
export const accessSchema = z.object({ reference, id, access })
export const moveSchema = z.object({ reference, id, by: z.union([z.literal(-1), z.literal(1)]) })
