import { z } from 'zod'
import { panelKeySchema, rowKey } from '../panels/schema'
import { mostReaders } from './limits'

export const seats = ['first', 'second', 'reader'] as const
export type Seat = (typeof seats)[number]

const reason = z.string().trim().min(3, 'Say in a few words why.').max(200, 'At most 200 characters.')

export const assignSchema = panelKeySchema.extend({
  pairs: z
    .array(z.object({ proposalId: rowKey, personId: rowKey, seat: z.enum(seats) }))
    .min(1, 'Choose a reviewer.')
    .max(2000),
})
export type AssignInput = z.output<typeof assignSchema>

export const takeOffSchema = panelKeySchema.extend({
  assignmentIds: z.array(rowKey).min(1).max(2000),
})
export type TakeOffInput = z.output<typeof takeOffSchema>

export const seatSchema = panelKeySchema.extend({ assignmentId: rowKey, seat: z.enum(seats) })
export type SeatInput = z.output<typeof seatSchema>

export const replaceSchema = panelKeySchema.extend({
  assignmentId: rowKey,
  personId: z
    .string()
    .regex(/^[1-9]\d{0,9}$/, 'Choose who takes over.')
    .transform(Number),
  reason,
})
export type ReplaceInput = z.output<typeof replaceSchema>

/** A reader goes from one proposal to another. */
export const moveSchema = panelKeySchema.extend({
  assignmentId: rowKey,
  proposalId: rowKey,
  seat: z.enum(seats),
})
export type MoveInput = z.output<typeof moveSchema>

const upTo = `Readers are a whole number up to ${mostReaders}.`

export const suggestSchema = panelKeySchema.extend({
  each: z
    .string()
    .trim()
    .regex(/^\d{1,2}$/, upTo)
    .refine((text) => Number(text) <= mostReaders, upTo)
    .transform(Number)
    .refine((each) => each > 0, 'At least one reader.'),
})
export type SuggestInput = z.output<typeof suggestSchema>

export const remindSchema = panelKeySchema.extend({ personId: rowKey })
export type RemindInput = z.output<typeof remindSchema>

export const startReviewSchema = z.object({ callId: rowKey })
