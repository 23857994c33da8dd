import { z } from 'zod'

const rule = z.enum(['hours', 'proposals', 'fixed'])

const writtenRule = z.object({
  rule,
  percents: z.array(z.object({ panelId: z.number(), percent: z.number() })),
  reason: z.string(),
  by: z.string(),
  at: z.string(),
  isStanding: z.boolean(),
})

/** A panel's part of a pool: what is asked, and what it gets by the rule. */
const poolPanel = z.object({
  panelId: z.number(),
  askedSeconds: z.number(),
  proposals: z.number(),
  shareSeconds: z.number(),
})

const sharedRow = z.object({
  proposalId: z.number(),
  reviewNumber: z.string(),
  title: z.string(),
  panelId: z.number(),
  panel: z.string(),
  /** Place among those of its panel that the reader sees. */
  rank: z.number(),
  place: z.number(),
  lines: z.array(z.object({ instrument: z.string(), telescopeId: z.number(), seconds: z.number() })),
  /** Part of its panel's share used with it, over those the reader sees; null where the panel has no share. */
  used: z.number().nullable(),
  isNear: z.boolean(),
  moves: z.array(
    z.object({ isUp: z.boolean(), reason: z.string(), by: z.string().nullable(), at: z.string() }),
  ),
})
export type SharedRow = z.output<typeof sharedRow>

export const sharingView = z.object({
  callId: z.number(),
  callNumber: z.number(),
  callSlug: z.string(),
  phase: z.enum(['planned', 'open', 'closed', 'review', 'ranking', 'decided', 'archived']),
  /** Leads a panel of the call: may move; of the office: may write percents. */
  reader: z.object({ leads: z.boolean(), isOffice: z.boolean() }),
  rule,
  percents: z.array(z.object({ panelId: z.number(), percent: z.number() })),
  /** Every rule that was written, the one that stands first; empty while the usual one holds. */
  written: z.array(writtenRule),
  /** Why the rule stays; null while it may be changed. */
  ruleFixed: z.string().nullable(),
  panels: z.array(
    z.object({
      id: z.number(),
      name: z.string(),
      proposals: z.number(),
      list: z.enum(['none', 'open', 'frozen']),
      listVersion: z.number().nullable(),
    }),
  ),
  pools: z.array(
    z.object({
      id: z.number(),
      name: z.string(),
      /** Dark time on offer, less what is held back. */
      offeredSeconds: z.number(),
      heldSeconds: z.number(),
      panels: z.array(poolPanel),
    }),
  ),
  /** The order: of the list that stands, else as the rule gives it; empty before every panel has frozen its list. */
  rows: z.array(sharedRow),
  list: z
    .object({
      id: z.number(),
      version: z.number(),
      number: z.number(),
      frozenAt: z.string().nullable(),
      /** A panel's list has changed since. */
      isStale: z.boolean(),
    })
    .nullable(),
  whyNotTogether: z.string().nullable(),
  /** Against the last frozen version before this one. */
  changes: z.array(z.object({ reviewNumber: z.string(), from: z.number(), to: z.number() })),
})
export type SharingView = z.output<typeof sharingView>
