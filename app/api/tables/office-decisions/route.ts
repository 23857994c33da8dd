import { z } from 'zod'
import { officeDecisionsView } from '@/lib/domain/decisions/officeDecisionsView'
import { readOfficeDecisions } from '@/lib/domain/decisions/readOfficeDecisions'
import { defineRoute } from '@/lib/http/defineRoute'

export const GET = defineRoute({
  name: 'GET /api/tables/office-decisions',
  query: z.object({ call: z.string().min(1).max(60) }),
  run: async (ctx, { query }) => officeDecisionsView.parse(await readOfficeDecisions(ctx, query.call)),
})
