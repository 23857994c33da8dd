import { z } from 'zod'
import { longestReason } from './rules'
import { assessmentVerdicts, type AssessmentVerdict } from './types'

const key = z.number().int().positive()

/** Keys of requests in addresses. */
export const requestKey = z
  .string()
  .regex(/^[1-9]\d{0,9}$/)
  .transform(Number)

const isVerdict = (text: string): text is AssessmentVerdict =>
  assessmentVerdicts.some((verdict) => verdict === text)

const verdict = z.string().transform((text, ctx) => {
  if (isVerdict(text)) return text
  ctx.addIssue({ code: 'custom', message: 'Choose one of the three.' })
  return z.NEVER
})

/** Hours typed with at most two decimals, kept as whole seconds. */
const hours = z.string().transform((text, ctx) => {
  const plain = text.trim().replace(',', '.')
  if (!/^\d{1,4}(\.\d{1,2})?$/.test(plain)) {
    ctx.addIssue({ code: 'custom', message: 'Give hours as a number, such as 20.2.' })
    return z.NEVER
  }
  return Math.round(Number(plain) * 3600)
})

const reason = z
  .string()
  .transform((text) => text.trim().replace(/\s+/g, ' '))
  .pipe(
    z
      .string()
      .min(1, 'Say why, in a line: the investigators and the panel read it.')
      .max(longestReason, `One line of at most ${longestReason} characters.`),
  )

export const assessRequestSchema = z.object({
  requestId: key,
  /** The assessment this one was written over; null for the first. */
  over: key.nullable(),
  verdict,
  trueHours: hours,
  reason,
  panelNote: z.string().trim().max(2000, 'At most 2,000 characters.'),
})

const days = ['2', '4', '7', '14'] as const

export const askQuestionSchema = z.object({
  requestId: key,
  question: z
    .string()
    .trim()
    .min(10, 'Write the question out, in a sentence.')
    .max(1000, 'At most 1,000 characters.'),
  withinDays: z.enum(days, 'Choose by when it should be answered.').transform(Number),
})

export const answerQuestionSchema = z.object({
  reference: z.string().min(1).max(7),
  questionId: key,
  answer: z.string().trim().min(1, 'Write the answer first.').max(2000, 'At most 2,000 characters.'),
})

export const passToPanelSchema = z.object({ instrumentId: key, callNumber: key })

export type AssessRequestInput = z.output<typeof assessRequestSchema>
export type AskQuestionInput = z.output<typeof askQuestionSchema>
export type AnswerQuestionInput = z.output<typeof answerQuestionSchema>
export type PassToPanelInput = z.output<typeof passToPanelSchema>
