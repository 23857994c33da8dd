import { z } from 'zod'
import { parseDeclination } from '@/lib/science/sky'

/** What can be tried on the help page: read by the same code as a proposal's targets. */
export const practiceSchema = z.object({
  declination: z.string().transform((text, context) => {
    const read = parseDeclination(text)
    if (read.ok) return read.deg
    context.addIssue({ code: 'custom', message: read.message })
    return z.NEVER
  }),
  hours: z
    .string()
    .refine(
      (text) => /^\d+([.,]\d)?$/.test(text.trim()),
      'Give the hours as a number in tenths, such as 3.0.',
    ),
})
