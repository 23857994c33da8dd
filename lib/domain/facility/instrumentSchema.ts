import { z } from 'zod'
import { carrier, nameFields } from './newRecordSchema'

/** A new instrument: its modes carry the records. */
export const newInstrumentSchema = z.object({
  ...nameFields,
  of: carrier('telescope'),
  summary: z
    .string()
    .trim()
    .min(1, 'Say in a few words what it is.')
    .max(200, 'At most 200 characters fit here.'),
})

export type NewInstrumentForm = z.input<typeof newInstrumentSchema>
