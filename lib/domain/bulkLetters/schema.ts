import { z } from 'zod'
import { problemOfFields } from './fields'

export const partsPlayed = ['lead', 'named', 'reviewer', 'chair', 'instrument-scientist', 'office'] as const
export const statesChosen = [
  'draft',
  'submitted',
  'under-review',
  'awarded',
  'reserve',
  'declined',
  'withdrawn',
] as const

/** Who is written to: the parts they play, in one call or in any, with proposals in these states or in any. */
export const audienceSchema = z.object({
  parts: z.array(z.enum(partsPlayed)),
  callId: z.string().regex(/^\d*$/, 'Choose a call.'),
  states: z.array(z.enum(statesChosen)),
})

export const saveBulkLetterSchema = audienceSchema
  .extend({
    /** 0 for a new one. */
    id: z.number().int().min(0),
    version: z.number().int().min(0),
    subject: z
      .string()
      .trim()
      .min(1, 'Give the letter a subject.')
      .max(200, 'A subject has at most 200 characters.')
      .refine((text) => !/[\r\n]/.test(text), 'A subject is one line.'),
    text: z
      .string()
      .trim()
      .min(1, 'Write what the letter says.')
      .max(20_000, 'A letter has at most 20,000 characters.'),
  })
  .superRefine((input, context) => {
    if (input.parts.length === 0)
      context.addIssue({ code: 'custom', path: ['parts'], message: 'Choose at least one part.' })
    for (const field of ['subject', 'text'] as const) {
      const message = problemOfFields(input[field], input)
      if (message) context.addIssue({ code: 'custom', path: [field], message })
    }
  })

export const sendBulkLetterSchema = z.object({
  id: z.number().int().positive(),
  version: z.number().int().positive(),
  /** How many people were shown; another number now is refused. */
  expected: z.number().int().positive(),
})

export const bulkStepSchema = z.object({ id: z.number().int().positive() })

/** How far a letter to many has got, in letters. */
export const bulkProgressReply = z.object({
  total: z.number(),
  waiting: z.number(),
  sent: z.number(),
  refused: z.number(),
  stopped: z.number(),
})

export type Audience = z.output<typeof audienceSchema>
export type SaveBulkLetter = z.output<typeof saveBulkLetterSchema>
export type BulkProgress = z.output<typeof bulkProgressReply>
