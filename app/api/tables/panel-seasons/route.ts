import { readSeasons } from '@/lib/domain/decisions/readSeasons'
import { seasonsQuery } from '@/lib/domain/decisions/schema'
import { seasonsView } from '@/lib/domain/decisions/seasonsView'
import { defineRoute } from '@/lib/http/defineRoute'

export const GET = defineRoute({
  name: 'GET /api/tables/panel-seasons',
  query: seasonsQuery,
  limit: { points: 120, seconds: 60 },
  run: async (ctx, { query }) => {
    const { call, panel, ...rest } = query
    return seasonsView.parse(await readSeasons(ctx, { ...rest, callSlug: call, panelId: panel }))
  },
})
