'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { leaveReview } from '@/lib/domain/recusals/leaveReview'
import { leaveReviewSchema } from '@/lib/domain/recusals/schema'
import { finishReview } from '@/lib/domain/reviews/finishReview'
import { reopenReview } from '@/lib/domain/reviews/reopenReview'
import { saveReviewText } from '@/lib/domain/reviews/saveReviewText'
import { saveScore } from '@/lib/domain/reviews/saveScore'
import { reviewKeySchema, saveReviewTextSchema, saveScoreSchema } from '@/lib/domain/reviews/schema'
import { paths } from '@/lib/paths'

const autosave = { points: 120, seconds: 60 }

export const saveScoreAction = defineAction({
  name: 'saveScore',
  schema: saveScoreSchema,
  run: saveScore,
  limit: autosave,
})

export const saveReviewTextAction = defineAction({
  name: 'saveReviewText',
  schema: saveReviewTextSchema,
  run: saveReviewText,
  limit: autosave,
})

export const finishReviewAction = defineAction({
  name: 'finishReview',
  schema: reviewKeySchema,
  run: finishReview,
  revalidate: (_, { assignmentId }) => [paths.review(assignmentId), paths.reviews()],
})

export const reopenReviewAction = defineAction({
  name: 'reopenReview',
  schema: reviewKeySchema,
  run: reopenReview,
  revalidate: (_, { assignmentId }) => [paths.review(assignmentId), paths.reviews()],
})

export const leaveReviewAction = defineAction({
  name: 'leaveReview',
  schema: leaveReviewSchema,
  run: leaveReview,
  revalidate: () => paths.reviews(),
  redirectTo: () => paths.reviews(),
})
