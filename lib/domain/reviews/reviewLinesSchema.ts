import { z } from 'zod'

const reviewLine = z.object({
  assignmentId: z.number(),
  callSlug: z.string(),
  callNumber: z.number(),
  reviewNumber: z.string(),
  title: z.string(),
  askedSeconds: z.number(),
  instruments: z.string(),
  verdict: z.enum(['feasible', 'marginal', 'not-feasible']).nullable(),
  score: z.number().nullable(),
  state: z.enum(['to-read', 'begun', 'finished']),
  dueAt: z.string(),
})

/** What the table of a reviewer's assignments is fed with. */
export const reviewLinesReply = z.object({ lines: z.array(reviewLine) })
