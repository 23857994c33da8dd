import { inverseRequest, invertCosmology } from '@/lib/domain/calculations/invertCosmology'
import { defineRoute } from '@/lib/http/defineRoute'
import { jsonOrCsv } from '@/lib/http/jsonOrCsv'

export const POST = defineRoute({
  name: 'POST /api/v1/cosmology/inverse',
  body: inverseRequest,
  maxBytes: 4_000_000,
  limit: { points: 120, seconds: 60 },
  run: async (_, { body, request }) => {
    const answer = invertCosmology(body)
    return jsonOrCsv(request, answer, answer.rows)
  },
})
