import { nightsView } from '@/lib/domain/decisions/nightsView'
import { readNights } from '@/lib/domain/decisions/readNights'
import { panelQuery } from '@/lib/domain/panels/schema'
import { defineRoute } from '@/lib/http/defineRoute'

export const GET = defineRoute({
  name: 'GET /api/tables/panel-nights',
  query: panelQuery,
  limit: { points: 120, seconds: 60 },
  run: async (ctx, { query }) =>
    nightsView.parse(await readNights(ctx, { callSlug: query.call, panelId: query.panel })),
})
