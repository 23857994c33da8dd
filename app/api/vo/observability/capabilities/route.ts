import { describeCapabilities } from '@/lib/domain/observability/describeCapabilities'
import { defineRoute } from '@/lib/http/defineRoute'
import { tableProblem } from '@/lib/http/tableProblem'
import { textResponse } from '@/lib/http/textResponse'

export const GET = defineRoute({
  name: 'GET /api/vo/observability/capabilities',
  limit: { points: 120, seconds: 60 },
  failure: tableProblem,
  run: async (ctx) => textResponse(describeCapabilities(ctx.request.origin), 'text/xml'),
})
