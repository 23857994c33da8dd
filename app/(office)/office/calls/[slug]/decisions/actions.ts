'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { approveDecisions } from '@/lib/domain/decisions/approveDecisions'
import { approveSchema } from '@/lib/domain/decisions/schema'

export const approveAsOfficeAction = defineAction({
  name: 'approveDecisions',
  schema: approveSchema,
  run: approveDecisions,
})
