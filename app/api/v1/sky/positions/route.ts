import { computePositions, positionsRequest } from '@/lib/domain/calculations/computePositions'
import { defineRoute } from '@/lib/http/defineRoute'
import { jsonOrCsv } from '@/lib/http/jsonOrCsv'

export const POST = defineRoute({
  name: 'POST /api/v1/sky/positions',
  body: positionsRequest,
  limit: { points: 60, seconds: 60 },
  run: async (_, { body, request }) => {
    const answer = computePositions(body)
    const rows = answer.instants.flatMap(({ targets, ...instant }) =>
      targets.map((target) => ({ ...instant, ...target })),
    )
    return jsonOrCsv(request, answer, rows)
  },
})
