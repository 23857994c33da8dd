import { z } from 'zod'

const reference = z
  .string()
  .regex(/^[0-9A-HJKMNP-TV-Z]{3}-[0-9A-HJKMNP-TV-Z]{3}$/, 'This is not a reference.')

export const startPaymentSchema = z.object({ reference })

export const askForWaiverSchema = z.object({
  reference,
  reason: z
    .string()
    .trim()
    .min(10, 'Say in a sentence why the fee should be waived.')
    .max(2000, 'Keep the reason below 2,000 characters.'),
})

export type AskForWaiverInput = z.input<typeof askForWaiverSchema>

export const decideWaiverSchema = z
  .object({
    waiverId: z.number().int().positive(),
    decision: z.enum(['granted', 'refused'], 'Grant it or refuse it.'),
    note: z.string().trim().max(300, 'Keep the note below 300 characters.'),
  })
  .refine(({ decision, note }) => decision === 'granted' || note.length > 0, {
    path: ['note'],
    message: 'Say why it is refused.',
  })

export type DecideWaiverInput = z.input<typeof decideWaiverSchema>
