import { ccdRequest, computeCcd } from '@/lib/domain/calculations/computeCcd'
import { defineRoute } from '@/lib/http/defineRoute'
import { jsonOrCsv } from '@/lib/http/jsonOrCsv'

export const POST = defineRoute({
  name: 'POST /api/v1/exposure/ccd',
  body: ccdRequest,
  limit: { points: 120, seconds: 60 },
  run: async (_, { body, request }) => {
    const answer = computeCcd(body)
    return jsonOrCsv(request, answer, [answer])
  },
})
