import { readLogbook } from '@/lib/domain/logbook/readLogbook'
import { logbookQuery, logbookReply } from '@/lib/domain/logbook/schema'
import { defineRoute } from '@/lib/http/defineRoute'

export const GET = defineRoute({
  name: 'GET /api/tables/office-logbook',
  query: logbookQuery,
  run: async (ctx, { query }) =>
    logbookReply.parse(await readLogbook(ctx, query.before ? Number(query.before) : null)),
})
