import { decisionsView } from '@/lib/domain/decisions/decisionsView'
import { readDecisions } from '@/lib/domain/decisions/readDecisions'
import { panelQuery } from '@/lib/domain/panels/schema'
import { defineRoute } from '@/lib/http/defineRoute'

export const GET = defineRoute({
  name: 'GET /api/tables/panel-decisions',
  query: panelQuery,
  limit: { points: 120, seconds: 60 },
  run: async (ctx, { query }) =>
    decisionsView.parse(await readDecisions(ctx, { callSlug: query.call, panelId: query.panel })),
})
