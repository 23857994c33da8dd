'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { approveDecisions } from '@/lib/domain/decisions/approveDecisions'
import { openDecision } from '@/lib/domain/decisions/openDecision'
import { approveSchema, openSchema } from '@/lib/domain/decisions/schema'

export const approveAsOfficeAction = defineAction({
  name: 'approveDecisions',
  schema: approveSchema,
  run: approveDecisions,
})

export const openAsOfficeAction = defineAction({
  name: 'openDecision',
  schema: openSchema,
  run: openDecision,
})
