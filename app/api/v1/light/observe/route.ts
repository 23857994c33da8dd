import { computeLight } from '@/lib/domain/calculations/computeLight'
import { observeLightRequest } from '@/lib/domain/calculations/observeLightSchema'
import { defineRoute } from '@/lib/http/defineRoute'
import { jsonOrCsv } from '@/lib/http/jsonOrCsv'

export const POST = defineRoute({
  name: 'POST /api/v1/light/observe',
  body: observeLightRequest,
  limit: { points: 120, seconds: 60 },
  run: async (_, { body, request }) => {
    const answer = computeLight(body)
    return jsonOrCsv(request, answer, answer.rows)
  },
})
