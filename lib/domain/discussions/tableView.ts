import { z } from 'zod'

const halfPoints = z.number().nullable()

/** What a member sees of the meeting. `apart`: something is discussed in which they have an interest; nothing of it is told. */
export const tableView = z.object({
  panelId: z.number(),
  panelName: z.string(),
  callSlug: z.string(),
  callNumber: z.number(),
  status: z.enum(['none', 'apart', 'now']),
  since: z.string().nullable(),
  quorum: z.number(),
  /** The reader, and whether they lead the panel. */
  me: z.object({ personId: z.number(), isPresent: z.boolean(), leads: z.boolean() }),
  present: z.number(),
  /** Only for whoever leads the panel: members do not learn which number is whose. */
  members: z.array(
    z.object({ personId: z.number(), number: z.number(), name: z.string(), isPresent: z.boolean() }),
  ),
  proposal: z
    .object({
      proposalId: z.number(),
      reviewNumber: z.string(),
      title: z.string(),
      lines: z.array(z.object({ instrument: z.string(), seconds: z.number() })),
    })
    .nullable(),
  /** By the reviewer's number: the first score, and the one given in the discussion. */
  scores: z.array(
    z.object({ reviewer: z.number(), before: z.number().nullable(), after: z.number().nullable() }),
  ),
  meanBefore: z.number().nullable(),
  meanAfter: z.number().nullable(),
  /** The own sheet, where the reader reads it. */
  own: z
    .object({
      assignmentId: z.number(),
      criteria: z.array(
        z.object({
          id: z.number(),
          title: z.string(),
          prompt: z.string(),
          weight: z.number(),
          before: halfPoints,
          after: halfPoints,
        }),
      ),
    })
    .nullable(),
})
export type TableView = z.output<typeof tableView>
