import { readRequestLines } from '@/lib/domain/assessments/readRequestLines'
import { requestLinesReply } from '@/lib/domain/assessments/requestLinesSchema'
import { defineRoute } from '@/lib/http/defineRoute'

export const GET = defineRoute({
  name: 'GET /api/tables/assessments',
  limit: { points: 120, seconds: 60 },
  run: async (ctx) => requestLinesReply.parse({ lines: await readRequestLines(ctx) }),
})
