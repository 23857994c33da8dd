import { z } from 'zod'
import { nightsPolicy } from './policyWords'
import { choiceOrRank, nightChoice } from './choiceWords'
import { policySummary } from './policySummary'

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
  /** Whose least it is, and why where the chair set it. */
  leastBy: z.enum(['chair', 'investigators', 'half']),
  leastReason: z.string(),
  /** The nights of a visit it wishes for; null for the queue. */
  visit: z
    .object({ nights: z.number(), part: z.enum(['whole', 'first', 'second']), together: z.boolean() })
    .nullable(),
  possible: z.boolean(),
  assessment: z
    .object({ verdict: z.enum(['accepted', 'change', 'not-possible']), reason: z.string() })
    .nullable(),
  givenSeconds: z.number(),
  isReserve: z.boolean(),
  service: z.enum(['queue', 'visitor']),
  conditions: z.string(),
  /** Of a visit, as they are typed: the nights that stand given, and those suggested. Empty in the queue. */
  evenings: z.string(),
  suggestedEvenings: z.string(),
  suggestedSeconds: z.number(),
  /** What it gives as things stand, while something else is tried. */
  standsSeconds: z.number().nullable(),
  /** Why the suggestion gives nothing: the seconds found when its turn came, and who would lose if it came first. */
  whyNot: z
    .object({
      reason: z.enum([
        'not-possible',
        'not-usable',
        'too-little-left',
        'set-aside',
        'never',
        'below-line',
        'no-nights',
        'nights-taken',
      ]),
      left: z.number(),
      displaces: z.array(z.object({ reviewNumber: z.string(), seconds: z.number() })),
      /** Of a visit: the most nights it would find alone, and the fewest of use. */
      nights: z.object({ most: z.number(), least: z.number() }).nullable(),
    })
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
  /** What the chair has laid down, and why; what a trial would lay down instead. */
  choice: z.object({ choice: nightChoice, reason: z.string() }).nullable(),
  tried: choiceOrRank.nullable(),
  decisionVersion: z.number(),
  lines: z.array(nightsLine),
})
export type NightsRow = z.output<typeof nightsRow>

/** A piece of a season: half-months counted from its first, two hours of sidereal time, a class of moonlight. */
const nightsBin = z.object({
  half: z.number(),
  siderealFromH: z.number(),
  moon: z.enum(['dark', 'grey', 'bright']),
  seconds: z.number(),
  usedSeconds: z.number(),
})
export type NightsBin = z.output<typeof nightsBin>

export const nightsView = z.object({
  panelId: z.number(),
  callNumber: z.number(),
  callSlug: z.string(),
  /** First evening of the season. */
  seasonFrom: z.string(),
  phase: z.enum(['planned', 'open', 'closed', 'review', 'ranking', 'decided', 'archived']),
  hasRanking: z.boolean(),
  /** The policy of the suggestion, and what each would come to. */
  policy: nightsPolicy,
  policies: z.array(policySummary),
  line: z.number(),
  /** Whether the nights lost are on record, and their share of the dark time on offer as counted here. */
  weather: z.object({ isRecorded: z.boolean(), lostShare: z.number() }),
  /** Review numbers that must be given time and cannot all be. */
  conflict: z.array(z.string()),
  isTrial: z.boolean(),
  rows: z.array(nightsRow),
  telescopes: z.array(
    z.object({
      id: z.number(),
      name: z.string(),
      offeredSeconds: z.number(),
      givenSeconds: z.number(),
      suggestedSeconds: z.number(),
      /** Held back for the director and targets of opportunity, and what for. */
      heldSeconds: z.number(),
      heldReason: z.string(),
      /** Suggested to visits, on dates of their own. */
      visitSeconds: z.number(),
      /** What may be planned with in the queue: on offer, less visits, weather and what is held back. */
      plannedSeconds: z.number(),
      /** Dark time on offer by sidereal time and moonlight, with what the suggestion lays there. */
      bins: z.array(nightsBin),
    }),
  ),
})
export type NightsView = z.output<typeof nightsView>
