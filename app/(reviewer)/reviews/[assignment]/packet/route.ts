import { z } from 'zod'
import { readReviewPacket } from '@/lib/domain/reviews/readReviewPacket'
import { assignmentKey } from '@/lib/domain/reviews/schema'
import { defineRoute } from '@/lib/http/defineRoute'
import { inlinePdf } from '@/lib/http/inlinePdf'

export const GET = defineRoute({
  name: 'GET /reviews/[assignment]/packet',
  params: z.object({ assignment: assignmentKey }),
  limit: { points: 60, seconds: 60 },
  run: async (ctx, { params }) => {
    const { bytes, fileName } = await readReviewPacket(ctx, params.assignment)
    return inlinePdf(bytes, fileName)
  },
})
