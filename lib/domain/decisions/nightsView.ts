import { z } from 'zod'

/** One instrument of a request: what was asked, what stands given, what the suggestion gives. Times in seconds. */
const nightsLine = z.object({
  proposalId: z.number(),
  instrumentId: z.number(),
  instrument: z.string(),
  telescopeId: z.number(),
  telescope: z.string(),
  askedSeconds: z.number(),
  /** What it truly takes, where assessed; else as asked. */
  wholeSeconds: z.number(),
  leastSeconds: z.number(),
  possible: z.boolean(),
  assessment: z
    .object({ verdict: z.enum(['accepted', 'change', 'not-possible']), reason: z.string() })
    .nullable(),
  givenSeconds: z.number(),
  isReserve: z.boolean(),
  service: z.enum(['queue', 'visitor']),
  conditions: z.string(),
  suggestedSeconds: z.number(),
  /** Why the suggestion gives nothing, and the seconds that were left. */
  whyNot: z
    .object({ reason: z.enum(['not-possible', 'too-little-left', 'set-aside']), left: z.number() })
    .nullable(),
})
export type NightsLine = z.output<typeof nightsLine>

const nightsRow = z.object({
  proposalId: z.number(),
  reviewNumber: z.string(),
  title: z.string(),
  rank: z.number(),
  isAbove: z.boolean(),
  setAside: z.boolean(),
  decisionVersion: z.number(),
  lines: z.array(nightsLine),
})
export type NightsRow = z.output<typeof nightsRow>

export const nightsView = z.object({
  panelId: z.number(),
  callNumber: z.number(),
  callSlug: z.string(),
  phase: z.enum(['planned', 'open', 'closed', 'review', 'ranking', 'decided', 'archived']),
  hasRanking: z.boolean(),
  line: z.number(),
  rows: z.array(nightsRow),
  telescopes: z.array(
    z.object({
      id: z.number(),
      name: z.string(),
      offeredSeconds: z.number(),
      givenSeconds: z.number(),
      suggestedSeconds: z.number(),
      /** Dark time on offer by half-month; `month` is `YYYY-MM`. */
      halves: z.array(
        z.object({ month: z.string(), half: z.union([z.literal(1), z.literal(2)]), seconds: z.number() }),
      ),
    }),
  ),
})
export type NightsView = z.output<typeof nightsView>
