'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { remindReviewer } from '@/lib/domain/assignments/remindReviewer'
import { remindSchema } from '@/lib/domain/assignments/schema'

export const remindReviewerAction = defineAction({
  name: 'remindReviewer',
  schema: remindSchema,
  run: remindReviewer,
  limit: { points: 60, seconds: 60 },
})
