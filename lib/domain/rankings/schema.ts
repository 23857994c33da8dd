import { z } from 'zod'
import { panelKeySchema, rowKey } from '../panels/schema'

const reason = z
  .string()
  .trim()
  .min(10, 'Give the reason in a sentence: the panel reads it.')
  .max(300, 'At most 300 characters.')

/** Names the list as it was on screen, so that two people never move over one another. */
const listKey = panelKeySchema.extend({ rankingId: rowKey, version: rowKey })
export type ListKeyInput = z.output<typeof listKey>

export const moveSchema = listKey.extend({
  proposalId: rowKey,
  place: z
    .string()
    .trim()
    .regex(/^\d{1,4}$/, 'Give the rank as a whole number.')
    .transform(Number)
    .refine((place) => place > 0, 'The first rank is 1.'),
  reason,
})
export type MoveInput = z.output<typeof moveSchema>

export const lineSchema = listKey.extend({ direction: z.enum(['up', 'down']) })
export type LineInput = z.output<typeof lineSchema>

export const freezeSchema = listKey
export const setAsideSchema = listKey.extend({ proposalIds: z.array(rowKey).min(1), aside: z.boolean() })
export type SetAsideInput = z.output<typeof setAsideSchema>

export const formulaSchema = panelKeySchema.extend({
  /** Empty: the panel has no measure of its own. */
  formula: z.string().trim().max(300, 'At most 300 characters.'),
})
export type FormulaInput = z.output<typeof formulaSchema>

export const consensusSchema = panelKeySchema.extend({
  proposalId: rowKey,
  /** Version of the draft decision; 0 while there is none. */
  version: z.number().int().min(0),
  statement: z.string().trim().max(8000, 'At most 8,000 characters.'),
})
export type ConsensusInput = z.output<typeof consensusSchema>
