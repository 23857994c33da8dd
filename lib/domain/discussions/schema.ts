import { z } from 'zod'
import { panelKeySchema, rowKey } from '../panels/schema'

export const discussSchema = panelKeySchema.extend({
  /** Null clears the table. */
  proposalId: rowKey.nullable(),
})
export type DiscussInput = z.output<typeof discussSchema>

export const presenceSchema = panelKeySchema.extend({ personId: rowKey, isPresent: z.boolean() })
export type PresenceInput = z.output<typeof presenceSchema>
