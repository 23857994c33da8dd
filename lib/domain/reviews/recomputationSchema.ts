import { z } from 'zod'

const verdict = z.enum(['feasible', 'marginal', 'not-feasible']).nullable()

/** Hours and verdict as stated and under another cosmology; what the handler answers and the desk reads. */
export const recomputationReply = z.object({
  cosmologyName: z.string(),
  stated: z.object({ cosmologyName: z.string(), neededSeconds: z.number(), verdict }),
  neededSeconds: z.number(),
  verdict,
  /** How many observations change their verdict. */
  flips: z.number().int(),
  targets: z.number().int(),
})

export type Recomputation = z.output<typeof recomputationReply>
