import { z } from 'zod'
import { assessmentVerdicts } from './types'

const requestLine = z.object({
  requestId: z.number(),
  callNumber: z.number(),
  instrumentId: z.number(),
  instrument: z.string(),
  reviewNumber: z.string(),
  title: z.string(),
  targets: z.number(),
  modes: z.string(),
  askedSeconds: z.number(),
  computedSeconds: z.number(),
  trueSeconds: z.number().nullable(),
  verdict: z.enum(['feasible', 'marginal', 'not-feasible']).nullable(),
  assessed: z.enum(assessmentVerdicts).nullable(),
  assessedAt: z.string().nullable(),
  reason: z.string(),
  passedAt: z.string().nullable(),
  isSettled: z.boolean(),
  question: z.enum(['none', 'asked', 'answered']),
})

/** What the table of requests is fed with. */
export const requestLinesReply = z.object({ lines: z.array(requestLine) })
