import { exportLogbook } from '@/lib/domain/logbook/exportLogbook'
import { logbookFilter } from '@/lib/domain/logbook/schema'
import { csvStream } from '@/lib/http/csvStream'
import { defineRoute } from '@/lib/http/defineRoute'

/** The logbook as the filter leaves it, whole, as a file. */
export const GET = defineRoute({
  name: 'GET /api/tables/office-logbook/file',
  query: logbookFilter,
  limit: { points: 30, seconds: 3600 },
  run: async (ctx, { query }) => csvStream('logbook.csv', await exportLogbook(ctx, query)),
})
