import { readLogbook } from '@/lib/domain/logbook/readLogbook'
import { logbookQuery, logbookReply } from '@/lib/domain/logbook/schema'
import { defineRoute } from '@/lib/http/defineRoute'

export const GET = defineRoute({
  name: 'GET /api/tables/office-logbook',
  query: logbookQuery,
  run: async (ctx, { query: { before, ...filter } }) =>
    logbookReply.parse(await readLogbook(ctx, before ? Number(before) : null, filter)),
})
