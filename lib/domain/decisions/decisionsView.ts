import { z } from 'zod'

const flag = z.object({
  kind: z.enum(['gives-away', 'names', 'tone', 'person', 'scores', 'contradicts']),
  at: z.number(),
  words: z.string(),
})

export const decisionRow = z.object({
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
  /** What in the statement deserves a second look. */
  flags: z.array(flag),
  /** Comments of the reviewers to the investigators, by number, with why one is kept from them. */
  comments: z.array(
    z.object({
      assignmentId: z.number(),
      reviewer: z.number(),
      body: z.string(),
      withheldReason: z.string().nullable(),
      flags: z.array(flag),
    }),
  ),
  /** Whether a second person stands behind it as it is. */
  approval: z.enum(['waits', 'changed', 'approved']),
  approvedBy: z.string().nullable(),
  /** Why its reader cannot approve it; null when they can. */
  whyNotApproved: z.string().nullable(),
  /** Whether its reader has opened it as it stands. */
  isOpened: z.boolean(),
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
