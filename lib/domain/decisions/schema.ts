import { z } from 'zod'
import { panelKeySchema, panelQuery, rowKey } from '../panels/schema'
import { nightsPolicy } from './nightsPolicySchema'

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
        conditions: z.string().trim().max(300, 'At most 300 characters.'),
      }),
    )
    .max(20),
})
export type AwardInput = z.output<typeof awardSchema>

export const planSchema = panelKeySchema.extend({ policy: nightsPolicy })
export type PlanInput = z.output<typeof planSchema>
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

/** The table of nights, under a policy. */
export const nightsQuery = panelQuery.extend({ policy: nightsPolicy.default('rank') })
