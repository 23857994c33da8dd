import { z } from 'zod'
import { panelKeySchema, panelQuery, rowKey } from '../panels/schema'
import { eveningsTyped } from '../visits/readEvenings'
import { choiceOrRank } from './choiceWords'
import { nightsPolicy } from './policyWords'
import { trialSchema, trialText } from './trialSchema'

/** Hours as typed, with a point or a comma; kept as whole seconds. */
const hoursAsSeconds = z
  .string()
  .trim()
  .regex(/^(\d{1,4}([.,]\d{1,3})?)?$/, 'Give hours as a number, such as 13.5.')
  .transform((text) => Math.round(Number(text.replace(',', '.') || '0') * 3600))

const version = z.number().int().min(0)

export const awardSchema = panelKeySchema.extend({
  proposalId: rowKey,
  /** Version of the prepared decision; 0 while there is none. */
  version,
  lines: z
    .array(
      z.object({
        instrumentId: rowKey,
        hours: hoursAsSeconds,
        isReserve: z.boolean(),
        service: z.enum(['queue', 'visitor']),
        /** The nights of a visit; its hours follow from them. */
        evenings: eveningsTyped,
        conditions: z.string().trim().max(300, 'At most 300 characters.'),
      }),
    )
    .max(20),
})
export type AwardInput = z.output<typeof awardSchema>

const reason = z.string().trim().max(500, 'At most 500 characters.')
const given = reason.min(10, 'Say why, in a few words: it is kept in the logbook.')

export const planSchema = panelKeySchema.extend({
  policy: nightsPolicy,
  /** Tried on the page, and taken with the plan. */
  trial: trialSchema.optional(),
  /** Why, where the trial lays something down. */
  reason: reason.optional(),
})
export type PlanInput = z.output<typeof planSchema>
/** Time, never, or fillers: whatever its rank. */
export const choiceSchema = panelKeySchema.extend({
  proposalId: rowKey,
  choice: choiceOrRank,
  reason: given,
})
export type ChoiceInput = z.output<typeof choiceSchema>

/** Hours of a telescope held back. */
export const heldSchema = panelKeySchema.extend({
  telescopeId: rowKey,
  hours: hoursAsSeconds,
  reason: given,
})
export type HeldInput = z.output<typeof heldSchema>

/** The least useful award of one instrument of a proposal; no hours give it back to the investigators. */
export const leastSchema = panelKeySchema.extend({
  proposalId: rowKey,
  instrumentId: rowKey,
  hours: hoursAsSeconds,
  reason: given,
})
export type LeastInput = z.output<typeof leastSchema>

export const prepareSchema = panelKeySchema

export const statementSchema = panelKeySchema.extend({
  proposalId: rowKey,
  version,
  statement: z
    .string()
    .trim()
    .min(20, 'Write a few sentences: the investigators read only this.')
    .max(8000, 'At most 8,000 characters.'),
})
export type StatementInput = z.output<typeof statementSchema>

export const releaseSchema = panelKeySchema.extend({
  typed: z.string().trim().min(1, 'Type the number of the call.'),
})
export type ReleaseInput = z.output<typeof releaseSchema>

/** A decision opened, at the version that was shown. */
export const openSchema = panelKeySchema.extend({
  proposalId: rowKey,
  version: z.number().int().positive(),
})
export type OpenInput = z.output<typeof openSchema>

/** What is approved, each at the version that was read. */
export const approveSchema = panelKeySchema.extend({
  decisions: z
    .array(z.object({ proposalId: rowKey, version: z.number().int().positive() }))
    .min(1)
    .max(2000),
})
export type ApproveInput = z.output<typeof approveSchema>

export const withholdSchema = panelKeySchema
  .extend({
    proposalId: rowKey,
    assignmentId: rowKey,
    withhold: z.boolean(),
    reason: z.string().trim().max(200, 'At most 200 characters.'),
  })
  .refine(({ withhold, reason }) => !withhold || reason.length >= 3, {
    path: ['reason'],
    message: 'Say in a few words why.',
  })
export type WithholdInput = z.output<typeof withholdSchema>

/** The table of nights, under a policy. */
export const nightsQuery = panelQuery.extend({
  policy: nightsPolicy.default('rank'),
  trial: trialText.optional(),
})

/** The same, run through seasons of weather: what is suggested, or what is given. */
export const seasonsQuery = nightsQuery.extend({ of: z.enum(['suggested', 'given']) })
