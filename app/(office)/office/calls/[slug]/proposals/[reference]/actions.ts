'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { extendProposal } from '@/lib/domain/calls/extendProposal'
import { extendProposalSchema } from '@/lib/domain/calls/extensionSchema'
import { closeRepair } from '@/lib/domain/papers/closeRepair'
import { openRepair } from '@/lib/domain/papers/openRepair'
import { openRepairSchema, takeBackRepairSchema } from '@/lib/domain/papers/repairSchema'

export const extendProposalAction = defineAction({
  name: 'extendProposal',
  schema: extendProposalSchema,
  run: extendProposal,
})

export const openRepairAction = defineAction({
  name: 'openRepair',
  schema: openRepairSchema,
  run: openRepair,
})

export const closeRepairAction = defineAction({
  name: 'closeRepair',
  schema: takeBackRepairSchema,
  run: closeRepair,
})
