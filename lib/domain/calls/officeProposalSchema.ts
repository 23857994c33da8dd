import { z } from 'zod'

const instant = z.iso.datetime()

/** One proposal of a call, as the office sees it. */
export const officeProposalRow = z.object({
  reference: z.string(),
  reviewNumber: z.string().nullable(),
  title: z.string(),
  state: z.string(),
  kind: z.string(),
  lead: z.string(),
  arrivedAt: instant.nullable(),
  askedSeconds: z.number(),
  feeState: z.string().nullable(),
  feeMinor: z.number().nullable(),
  currency: z.string(),
  paidMinor: z.number(),
  refundedMinor: z.number(),
  affiliationClass: z.enum(['member', 'partner', 'other']).nullable(),
  /** Held by a card holder's bank, or taken by it. */
  disputedMinor: z.number(),
  lostMinor: z.number(),
  invoice: z.object({ number: z.string(), isOverdue: z.boolean() }).nullable(),
  waiverId: z.number().nullable(),
  waiverReason: z.string().nullable(),
})

export const officeProposalsReply = z.object({ rows: z.array(officeProposalRow) })

export type OfficeProposalRow = z.output<typeof officeProposalRow>
export type OfficeProposalsReply = z.output<typeof officeProposalsReply>
