'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { prepareDecisions } from '@/lib/domain/decisions/prepareDecisions'
import { releaseDecisions } from '@/lib/domain/decisions/releaseDecisions'
import { saveStatement } from '@/lib/domain/decisions/saveStatement'
import { prepareSchema, releaseSchema, statementSchema } from '@/lib/domain/decisions/schema'

export const prepareDecisionsAction = defineAction({
  name: 'prepareDecisions',
  schema: prepareSchema,
  run: prepareDecisions,
})

export const saveStatementAction = defineAction({
  name: 'saveStatement',
  schema: statementSchema,
  run: saveStatement,
})

export const releaseDecisionsAction = defineAction({
  name: 'releaseDecisions',
  schema: releaseSchema,
  run: releaseDecisions,
  limit: { points: 20, seconds: 600 },
})
