import { z } from 'zod'
import { firstEvening } from './recordSchema'

const subject = {
  kind: z.enum(['site', 'telescope', 'instrument', 'mode']),
  slug: z.string().min(1).max(60),
  /** The retirement when the page was read, null for none: somebody else's is not written over unseen. */
  before: z.string().max(10).nullable(),
}

/** What retires, and the first evening it is no longer there. */
export const retireSchema = z.object({ ...subject, retiredFrom: firstEvening })

export type RetireForm = z.input<typeof retireSchema>

/** What stays after all. */
export const keepSchema = z.object(subject)

export type KeepForm = z.input<typeof keepSchema>
