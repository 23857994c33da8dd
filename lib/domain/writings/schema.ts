import { z } from 'zod'
import { cleanText } from '../proposals/cleanText'
import { reference } from '../proposals/schema'
import { maxTextCharacters } from './limits'

/** A text as typed. How many words it may have is for completeness to say: nothing typed is turned away for that. */
export const writingSchema = z.object({
  text: z
    .string()
    .max(maxTextCharacters, 'This is too long to be kept: at most 100,000 characters are taken.')
    .transform(cleanText),
})

export const saveWritingSchema = writingSchema.extend({
  reference,
  part: z.enum(['justification', 'references', 'team']),
  /** As it was read; 0 when nothing was written yet. */
  version: z.number().int().nonnegative(),
})

const id = z.number().int().positive()
const label = z
  .string()
  .trim()
  .regex(/^[A-Za-z0-9][A-Za-z0-9._-]{0,39}$/, 'A label has letters, figures, dots and dashes, at most 40.')

/** What stands under a figure, and what the text calls it. */
export const figureWordsSchema = z.object({
  label,
  caption: z.string().max(4000, 'A caption has at most 4,000 characters.').transform(cleanText),
})

export const saveFigureSchema = figureWordsSchema.extend({ reference, id, version: id })
export const figureSchema = z.object({ reference, id })
export const moveFigureSchema = z.object({ reference, id, by: z.union([z.literal(-1), z.literal(1)]) })

/** What the browser sends: the picture, and what it knows of it, so that a broken journey is noticed. */
export const uploadFigureSchema = z.object({
  reference,
  /** The figure whose picture it takes the place of; empty for a new one. */
  figureId: z
    .string()
    .regex(/^\d{0,9}$/)
    .transform((text) => (text === '' ? null : Number(text))),
  /** Sent before, and its answer lost: it may be kept already. */
  again: z.literal('yes').optional(),
  file: z.instanceof(File, { message: 'Choose a picture.' }),
  sha256: z.string().regex(/^[0-9a-f]{64}$/, 'The browser did not say what it sent. Try again.'),
  sizeBytes: z
    .string()
    .regex(/^\d{1,10}$/, 'The browser did not say how much it sent. Try again.')
    .transform(Number),
})
