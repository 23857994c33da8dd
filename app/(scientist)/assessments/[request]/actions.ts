'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { askQuestion } from '@/lib/domain/assessments/askQuestion'
import { assessRequest } from '@/lib/domain/assessments/assessRequest'
import { askQuestionSchema, assessRequestSchema } from '@/lib/domain/assessments/schema'
import { paths } from '@/lib/paths'

export const assessRequestAction = defineAction({
  name: 'assessRequest',
  schema: assessRequestSchema,
  run: assessRequest,
  revalidate: (_, { requestId }) => [paths.assessment(requestId), paths.assessments()],
})

export const askQuestionAction = defineAction({
  name: 'askQuestion',
  schema: askQuestionSchema,
  run: askQuestion,
  revalidate: (_, { requestId }) => paths.assessment(requestId),
  limit: { points: 20, seconds: 3600 },
})
