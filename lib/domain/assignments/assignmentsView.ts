import { z } from 'zod'
import { seats } from './schema'

const reader = z.object({
  assignmentId: z.number(),
  personId: z.number(),
  seat: z.enum(seats),
  state: z.enum(['to-read', 'begun', 'finished']),
})

/** A proposal with its readers; those who may not read it are left out of `mayRead`. */
export const assignmentRow = z.object({
  proposalId: z.number(),
  reviewNumber: z.string(),
  title: z.string(),
  kind: z.string(),
  pages: z.number(),
  readers: z.array(reader),
  interests: z.array(z.object({ personId: z.number(), words: z.string() })),
  /** How well each reviewer of the view, in its order, knows the subject, 0 to 1; null for who has not said. */
  affinities: z.array(z.number().nullable()),
})
export type AssignmentRow = z.output<typeof assignmentRow>

export const panelReviewer = z.object({
  personId: z.number(),
  number: z.number(),
  name: z.string(),
  mayReview: z.boolean(),
  hasDeclared: z.boolean(),
  hasStated: z.boolean(),
  proposals: z.number(),
  pages: z.number(),
  finished: z.number(),
  /** Review numbers of what is not finished. */
  owed: z.array(z.string()),
  remindedAt: z.string().nullable(),
  /** Why no reminder can go now; null when one can. */
  whyNotReminded: z.string().nullable(),
})
export type PanelReviewer = z.output<typeof panelReviewer>

export const assignmentsView = z.object({
  panelId: z.number(),
  panelName: z.string(),
  callId: z.number(),
  callNumber: z.number(),
  callSlug: z.string(),
  phase: z.enum(['planned', 'open', 'closed', 'review', 'ranking', 'decided', 'archived']),
  quorum: z.number(),
  reviewsDueAt: z.string(),
  rows: z.array(assignmentRow),
  reviewers: z.array(panelReviewer),
  /** Reviews that were left because of an interest, the newest first. */
  recusals: z.array(
    z.object({ reviewNumber: z.string(), name: z.string(), reason: z.string(), at: z.string() }),
  ),
  /** How many groups of reviewers share no proposal with the others; one is what is wanted. */
  groups: z.number(),
})
export type AssignmentsView = z.output<typeof assignmentsView>
