import { answerObservability } from '@/lib/domain/observability/answerObservability'
import { defineRoute } from '@/lib/http/defineRoute'
import { tableProblem } from '@/lib/http/tableProblem'
import { textResponse } from '@/lib/http/textResponse'

const limit = { points: 60, seconds: 60 }

export const GET = defineRoute({
  name: 'GET /api/vo/observability/query',
  limit,
  failure: tableProblem,
  run: async (ctx, { request }) => {
    const { text, mediaType } = await answerObservability(ctx, request.nextUrl.searchParams)
    return textResponse(text, mediaType)
  },
})

export const POST = defineRoute({
  name: 'POST /api/vo/observability/query',
  accepts: 'application/x-www-form-urlencoded',
  maxBytes: 10_000,
  limit,
  failure: tableProblem,
  run: async (ctx, { text: form }) => {
    const { text, mediaType } = await answerObservability(ctx, new URLSearchParams(form))
    return textResponse(text, mediaType)
  },
})
