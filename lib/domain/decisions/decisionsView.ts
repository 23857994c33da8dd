import { z } from 'zod'

const decisionRow = z.object({
  proposalId: z.number(),
  reviewNumber: z.string(),
  title: z.string(),
  rank: z.number(),
  isAbove: z.boolean(),
  outcome: z.enum(['awarded', 'reserve', 'declined']),
  lines: z.array(
    z.object({
      instrumentId: z.number(),
      instrument: z.string(),
      seconds: z.number(),
      isReserve: z.boolean(),
      conditions: z.string(),
    }),
  ),
  askedSeconds: z.number(),
  statement: z.string(),
  version: z.number(),
  isPrepared: z.boolean(),
  releasedAt: z.string().nullable(),
})
export type DecisionRow = z.output<typeof decisionRow>

export const decisionsView = z.object({
  panelId: z.number(),
  callNumber: z.number(),
  callSlug: z.string(),
  phase: z.enum(['planned', 'open', 'closed', 'review', 'ranking', 'decided', 'archived']),
  lettersAt: z.string(),
  hasRanking: z.boolean(),
  isFrozen: z.boolean(),
  rows: z.array(decisionRow),
  /** Why they cannot be made known yet, by what the reader may see; null when they can. */
  whyNot: z.string().nullable(),
  isReleased: z.boolean(),
})
export type DecisionsView = z.output<typeof decisionsView>
