import { nightsView } from '@/lib/domain/decisions/nightsView'
import { readNights } from '@/lib/domain/decisions/readNights'
import { nightsQuery } from '@/lib/domain/decisions/schema'
import { defineRoute } from '@/lib/http/defineRoute'

export const GET = defineRoute({
  name: 'GET /api/tables/panel-nights',
  query: nightsQuery,
  limit: { points: 120, seconds: 60 },
  run: async (ctx, { query }) =>
    nightsView.parse(
      await readNights(ctx, {
        callSlug: query.call,
        panelId: query.panel,
        policy: query.policy,
        trial: query.trial,
      }),
    ),
})
