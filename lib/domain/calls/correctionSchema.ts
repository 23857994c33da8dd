import { z } from 'zod'

export const correctCallSchema = z.object({
  slug: z.string().min(1).max(60),
  version: z.number().int().positive(),
  concerns: z
    .string()
    .trim()
    .min(1, 'Say in a few words what is corrected.')
    .max(120, 'At most 120 characters.'),
  body: z.string().trim().min(1, 'Say what holds instead.').max(2000, 'At most 2,000 characters.'),
})
