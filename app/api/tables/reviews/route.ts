import { readReviewLines } from '@/lib/domain/reviews/readReviewLines'
import { reviewLinesReply } from '@/lib/domain/reviews/reviewLinesSchema'
import { defineRoute } from '@/lib/http/defineRoute'

export const GET = defineRoute({
  name: 'GET /api/tables/reviews',
  limit: { points: 120, seconds: 60 },
  run: async (ctx) =>
    reviewLinesReply.parse({ lines: (await readReviewLines(ctx)).flatMap(({ lines }) => lines) }),
})
