import { z } from 'zod'

const instant = z.iso.datetime()

/** One line of the table of own proposals. */
export const proposalRow = z.object({
  reference: z.string(),
  title: z.string(),
  state: z.enum([
    'draft',
    'submitted',
    'under-review',
    'awarded',
    'reserve',
    'declined',
    'withdrawn',
    'lapsed',
  ]),
  isReopened: z.boolean(),
  isPutAway: z.boolean(),
  callNumber: z.number(),
  callSlug: z.string(),
  callTitle: z.string(),
  kindTitle: z.string(),
  askedSeconds: z.number(),
  targets: z.number(),
  lead: z.string(),
  isLead: z.boolean(),
  hasAgreed: z.boolean(),
  deadline: instant,
  /** Something can still be done before the deadline. */
  isOpen: z.boolean(),
  updatedAt: instant,
  /** Number of the open call it can be carried on in; null for none. */
  continueIn: z.number().nullable(),
})

export const proposalsReply = z.object({ now: instant, rows: z.array(proposalRow) })

export type ProposalRow = z.output<typeof proposalRow>
export type ProposalsReply = z.output<typeof proposalsReply>
