import { z } from 'zod'
import { reference } from '../proposals/schema'
import { moment } from './moment'

export const extendProposalSchema = z.object({
  reference,
  closesAt: moment,
  why: z.string().trim().min(1, 'Say why: it stands in the logbook.').max(500, 'At most 500 characters.'),
})
