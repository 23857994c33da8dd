import { z } from 'zod'

const modeId = z
  .string()
  .regex(/^\d{1,9}$/, 'There is no such mode.')
  .transform(Number)

/** What a call is to offer, and what it offered when the page was read. */
export const saveOfferSchema = z.object({
  slug: z.string().min(1).max(60),
  before: z.array(z.number().int().positive()).max(1000),
  modeIds: z.array(modeId).max(1000),
})
