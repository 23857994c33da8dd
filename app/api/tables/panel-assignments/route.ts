import { readAssignments } from '@/lib/domain/assignments/readAssignments'
import { assignmentsView } from '@/lib/domain/assignments/assignmentsView'
import { panelQuery } from '@/lib/domain/panels/schema'
import { defineRoute } from '@/lib/http/defineRoute'

export const GET = defineRoute({
  name: 'GET /api/tables/panel-assignments',
  query: panelQuery,
  limit: { points: 120, seconds: 60 },
  run: async (ctx, { query }) =>
    assignmentsView.parse(await readAssignments(ctx, { callSlug: query.call, panelId: query.panel })),
})
