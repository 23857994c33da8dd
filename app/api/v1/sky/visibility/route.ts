import { computeVisibility, visibilityRequest } from '@/lib/domain/calculations/computeVisibility'
import { defineRoute } from '@/lib/http/defineRoute'
import { jsonOrCsv } from '@/lib/http/jsonOrCsv'

export const POST = defineRoute({
  name: 'POST /api/v1/sky/visibility',
  body: visibilityRequest,
  limit: { points: 60, seconds: 60 },
  run: async (_, { body, request }) => {
    const answer = computeVisibility(body)
    const rows = answer.targets.flatMap(({ id, byNight }) =>
      byNight.map((hours, index) => ({ id, ...answer.nights[index], hours })),
    )
    return jsonOrCsv(request, answer, rows)
  },
})
