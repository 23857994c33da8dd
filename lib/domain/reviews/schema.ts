import { z } from 'zod'
import { audiences } from './types'
import { longestText } from './rules'

const key = z.number().int().positive()

/** Keys of assignments in addresses. */
export const assignmentKey = z
  .string()
  .regex(/^[1-9]\d{0,9}$/)
  .transform(Number)

export const saveScoreSchema = z.object({
  assignmentId: key,
  criterionId: key,
  /** Half points; null takes a score back. */
  halfPoints: z
    .number('A score is a number from 0 to 10 in halves.')
    .int('Scores go in halves.')
    .min(0, 'The lowest score is 0.')
    .max(20, 'The highest score is 10.')
    .nullable(),
})

export const saveReviewTextSchema = z.object({
  assignmentId: key,
  audience: z.enum(audiences),
  body: z.string().max(longestText, `At most ${longestText.toLocaleString('en-GB')} characters.`),
  version: z.number().int().min(0),
})

export const reviewKeySchema = z.object({ assignmentId: key, version: key })

export type SaveScoreInput = z.output<typeof saveScoreSchema>
export type SaveReviewTextInput = z.output<typeof saveReviewTextSchema>
export type ReviewKeyInput = z.output<typeof reviewKeySchema>
