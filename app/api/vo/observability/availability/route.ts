import { describeAvailability } from '@/lib/domain/observability/describeAvailability'
import { defineRoute } from '@/lib/http/defineRoute'
import { tableProblem } from '@/lib/http/tableProblem'
import { textResponse } from '@/lib/http/textResponse'

export const GET = defineRoute({
  name: 'GET /api/vo/observability/availability',
  limit: { points: 120, seconds: 60 },
  failure: tableProblem,
  run: async (ctx) => textResponse(await describeAvailability(ctx), 'text/xml'),
})
