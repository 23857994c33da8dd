import { z } from 'zod'

const line = z.object({
  instrumentId: z.number(),
  instrument: z.string(),
  telescopeId: z.number(),
  telescope: z.string(),
  seconds: z.number(),
})

export const rankingRow = z.object({
  proposalId: z.number(),
  reviewNumber: z.string(),
  title: z.string(),
  rank: z.number(),
  lines: z.array(line),
  askedSeconds: z.number(),
  raw: z.number().nullable(),
  spread: z.number().nullable(),
  reviews: z.number(),
  /** Place by raw mean, by merit. */
  rawRank: z.number().nullable(),
  meritRank: z.number().nullable(),
  merit: z.number().nullable(),
  shift: z.number().nullable(),
  error: z.number().nullable(),
  chance: z.number().nullable(),
  low: z.number().nullable(),
  high: z.number().nullable(),
  lowerHalf: z.number().nullable(),
  upperHalf: z.number().nullable(),
  /** The panel's own measure, and the place by it. */
  measure: z.number().nullable(),
  measureRank: z.number().nullable(),
  setAside: z.boolean(),
  why: z.string().nullable(),
  scores: z.array(z.object({ reviewer: z.number(), score: z.number() })),
  moves: z.array(
    z.object({ isUp: z.boolean(), reason: z.string(), by: z.string().nullable(), at: z.string() }),
  ),
})
export type RankingRow = z.output<typeof rankingRow>

export const rankingView = z.object({
  panelId: z.number(),
  panelName: z.string(),
  callNumber: z.number(),
  callSlug: z.string(),
  phase: z.enum(['planned', 'open', 'closed', 'review', 'ranking', 'decided', 'archived']),
  /** Null while the order is only that of the raw means so far. */
  list: z
    .object({ id: z.number(), version: z.number(), number: z.number(), frozenAt: z.string().nullable() })
    .nullable(),
  /** Who asks may be read: a list of this panel was frozen. */
  teamsOpen: z.boolean(),
  line: z.number(),
  rows: z.array(rankingRow),
  scores: z.number(),
  reviewers: z.number(),
  owed: z.number(),
  telescopes: z.array(
    z.object({
      id: z.number(),
      name: z.string(),
      offeredSeconds: z.number(),
      askedSeconds: z.number(),
      proposals: z.number(),
    }),
  ),
  leniency: z.array(z.object({ reviewer: z.number(), points: z.number(), error: z.number() })),
  test: z.object({ f: z.number(), between: z.number(), within: z.number(), p: z.number() }).nullable(),
  corrected: z.boolean(),
  whyNot: z.string().nullable(),
  agreement: z
    .object({
      single: z.number(),
      mean: z.number(),
      leftOver: z.number(),
      meanReviews: z.number(),
      alpha: z.number().nullable(),
    })
    .nullable(),
  /** The panel's own measure: its words, who wrote them, what may stand in it, and why it stays as it is (null: it may change). */
  formula: z.object({
    text: z.string().nullable(),
    by: z.string().nullable(),
    at: z.string().nullable(),
    fixed: z.string().nullable(),
    /** Names with what they are. */
    quantities: z.array(z.object({ name: z.string(), words: z.string() })),
    /** Review numbers for which it has no value. */
    without: z.array(z.string()),
  }),
  draws: z.number(),
  seed: z.number(),
  /** Against the last frozen version before this one. */
  changes: z.array(z.object({ reviewNumber: z.string(), from: z.number(), to: z.number() })),
})
export type RankingView = z.output<typeof rankingView>
