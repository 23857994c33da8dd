'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { approveDecisions } from '@/lib/domain/decisions/approveDecisions'
import { openDecision } from '@/lib/domain/decisions/openDecision'
import { prepareDecisions } from '@/lib/domain/decisions/prepareDecisions'
import { releaseDecisions } from '@/lib/domain/decisions/releaseDecisions'
import { saveStatement } from '@/lib/domain/decisions/saveStatement'
import {
  approveSchema,
  openSchema,
  prepareSchema,
  releaseSchema,
  statementSchema,
  withholdSchema,
} from '@/lib/domain/decisions/schema'
import { withholdComment } from '@/lib/domain/decisions/withholdComment'

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

export const approveDecisionsAction = defineAction({
  name: 'approveDecisions',
  schema: approveSchema,
  run: approveDecisions,
})

export const withholdCommentAction = defineAction({
  name: 'withholdComment',
  schema: withholdSchema,
  run: withholdComment,
})

export const openDecisionAction = defineAction({
  name: 'openDecision',
  schema: openSchema,
  run: openDecision,
})
