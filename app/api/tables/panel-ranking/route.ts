import { readRanking } from '@/lib/domain/rankings/readRanking'
import { rankingView } from '@/lib/domain/rankings/rankingView'
import { panelQuery } from '@/lib/domain/panels/schema'
import { defineRoute } from '@/lib/http/defineRoute'

export const GET = defineRoute({
  name: 'GET /api/tables/panel-ranking',
  query: panelQuery,
  limit: { points: 120, seconds: 60 },
  run: async (ctx, { query }) =>
    rankingView.parse(await readRanking(ctx, { callSlug: query.call, panelId: query.panel })),
})
