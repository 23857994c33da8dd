import { z } from 'zod'
import type { SeasonPlan } from '@/lib/panel/nights/seasonTypes'

const pair = z.tuple([z.number(), z.number()])

/** A plan and the nights it is run in, as it travels: bins with seconds or shares as pairs. */
export const seasonsView = z.object({
  /** Whether the nights lost are on record, or tried. */
  hasWeather: z.boolean(),
  lost: z.array(z.number()),
  persistence: z.number(),
  /** Evening, bin and seconds, in the order of time. */
  pieces: z.array(z.tuple([z.number(), z.number(), z.number()])),
  awards: z.array(
    z.object({
      proposalId: z.number(),
      instrumentId: z.number(),
      parts: z.array(z.object({ seconds: z.number(), laid: z.array(pair), share: z.array(pair) })),
    }),
  ),
})
export type SeasonsView = z.output<typeof seasonsView>

/** The plan as it is run. */
export const seasonPlanOf = ({ lost, persistence, pieces, awards }: SeasonsView): SeasonPlan => ({
  ...{ lost, persistence },
  pieces: pieces.map(([night, bin, seconds]) => ({ night, bin, seconds })),
  awards: awards.map(({ proposalId, instrumentId, parts }) => ({
    proposal: proposalId,
    instrument: instrumentId,
    parts: parts.map(({ seconds, laid, share }) => ({
      seconds,
      laid: new Map(laid),
      share: new Map(share),
    })),
  })),
})
