import { z } from 'zod'
import { reference } from '../proposals/schema'

export const continueSchema = z.object({
  reference,
  kindId: z
    .string()
    .regex(/^\d{1,9}$/, 'Choose what kind of proposal it is to be.')
    .transform(Number),
})
