import { z } from 'zod'
import { recomputationReply } from '@/lib/domain/reviews/recomputationSchema'
import { recomputeReview } from '@/lib/domain/reviews/recomputeReview'
import { assignmentKey } from '@/lib/domain/reviews/schema'
import { defineRoute } from '@/lib/http/defineRoute'

export const GET = defineRoute({
  name: 'GET /api/reviews/[assignment]/recomputed',
  params: z.object({ assignment: assignmentKey }),
  query: z.object({ cosmology: z.string().min(1).max(40) }),
  limit: { points: 30, seconds: 60 },
  run: async (ctx, { params, query }) =>
    recomputationReply.parse(await recomputeReview(ctx, params.assignment, query.cosmology)),
})
