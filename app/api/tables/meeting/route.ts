import { readTable } from '@/lib/domain/discussions/readTable'
import { tableView } from '@/lib/domain/discussions/tableView'
import { panelQuery } from '@/lib/domain/panels/schema'
import { defineRoute } from '@/lib/http/defineRoute'

export const GET = defineRoute({
  name: 'GET /api/tables/meeting',
  query: panelQuery,
  limit: { points: 120, seconds: 60 },
  run: async (ctx, { query }) =>
    tableView.parse(await readTable(ctx, { callSlug: query.call, panelId: query.panel })),
})
