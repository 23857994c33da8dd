'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { answerQuestion } from '@/lib/domain/assessments/answerQuestion'
import { answerQuestionSchema } from '@/lib/domain/assessments/schema'
import { paths } from '@/lib/paths'

export const answerQuestionAction = defineAction({
  name: 'answerQuestion',
  schema: answerQuestionSchema,
  run: answerQuestion,
  revalidate: (_, { reference }) => paths.proposal(reference),
  limit: { points: 20, seconds: 60 },
})
