import { z } from 'zod'
import { typedNumber } from '../targets/typedNumber'

/** The most nights one visit may be wished for. */
export const mostNights = 30

/** How time on an instrument is wished for: text as typed in, what is kept out. */
export const wishSchema = z
  .object({
    least: typedNumber('The least of use', 0.1, 2000),
    service: z.enum(['queue', 'visitor']),
    nights: typedNumber('The nights of a visit', 1, mostNights),
    part: z.enum(['whole', 'first', 'second']),
    together: z.boolean(),
  })
  .transform(({ least, service, nights, part, together }, ctx) => {
    const leastSeconds = least.value === null ? null : Math.round(least.value * 3600)
    if (service === 'queue') return { leastSeconds, visit: null }
    if (nights.value === null || !Number.isInteger(nights.value)) {
      ctx.addIssue({
        code: 'custom',
        path: ['nights'],
        message: 'Say how many nights you come for, as a whole number.',
      })
      return z.NEVER
    }
    return { leastSeconds, visit: { nights: nights.value, part, together } }
  })
export type WishRow = z.input<typeof wishSchema>

export const saveWishSchema = z.object({
  reference: z.string().max(10),
  instrumentId: z.number().int().positive(),
  /** 0 while nothing is said of the instrument yet. */
  version: z.number().int().nonnegative(),
  wish: wishSchema,
})
export type SaveWishInput = z.output<typeof saveWishSchema>
