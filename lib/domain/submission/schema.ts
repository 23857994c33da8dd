import { z } from 'zod'

const reference = z
  .string()
  .regex(/^[0-9A-HJKMNP-TV-Z]{3}-[0-9A-HJKMNP-TV-Z]{3}$/, 'This is not a reference.')

/** One press of the button. What follows the sending is a wish: the proposal is in whether or not it succeeds. */
export const sendSchema = z
  .object({
    reference,
    idempotencyKey: z.uuid('This form is out of date. Load the page again.'),
    declaration: z
      .boolean()
      .refine(
        (isTicked) => isTicked,
        'Say that everyone named has read this version and agrees to it being sent.',
      ),
    then: z.enum(['pay', 'later', 'waiver']),
    waiverReason: z.string().trim().max(2000, 'Keep the reason below 2,000 characters.'),
  })
  .refine((sent) => sent.then !== 'waiver' || sent.waiverReason.length >= 10, {
    path: ['waiverReason'],
    message: 'Say in a sentence why the fee should be waived.',
  })

export type SendInput = z.input<typeof sendSchema>

export const reopenSchema = z.object({ reference })

export const withdrawSchema = z.object({
  reference,
  reason: z
    .string()
    .trim()
    .min(1, 'Say in a few words why it is withdrawn.')
    .max(500, 'Keep the reason below 500 characters.'),
})

export type WithdrawInput = z.input<typeof withdrawSchema>
