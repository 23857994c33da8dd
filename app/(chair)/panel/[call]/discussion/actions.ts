'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { saveStatement } from '@/lib/domain/decisions/saveStatement'
import { consensusSchema, setAsideSchema } from '@/lib/domain/rankings/schema'
import { setAside } from '@/lib/domain/rankings/setAside'

export const saveConsensusAction = defineAction({
  name: 'saveConsensus',
  schema: consensusSchema,
  run: saveStatement,
})

export const setAsideAction = defineAction({ name: 'setAside', schema: setAsideSchema, run: setAside })
