import { z } from 'zod'
import { moment } from '../calls/moment'
import { reference } from '../proposals/schema'
import { paperKind } from './schema'

export const openRepairSchema = z.object({
  reference,
  kind: paperKind,
  openUntil: moment,
  reason: z
    .string()
    .trim()
    .min(1, 'Say what is wrong with the file: it stands in the logbook.')
    .max(500, 'At most 500 characters.'),
})

export const takeBackRepairSchema = z.object({ reference, repairId: z.number().int().positive() })
