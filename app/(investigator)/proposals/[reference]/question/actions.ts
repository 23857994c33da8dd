'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { saveQuestion } from '@/lib/domain/proposals/saveQuestion'
import { saveQuestionSchema } from '@/lib/domain/proposals/schema'
import { paths } from '@/lib/paths'

export const saveQuestionAction = defineAction({
  name: 'saveQuestion',
  schema: saveQuestionSchema,
  run: saveQuestion,
  revalidate: (_, { reference }) => paths.proposalSection(reference, 'question'),
  limit: { points: 90, seconds: 60 },
})
