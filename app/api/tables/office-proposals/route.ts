import { z } from 'zod'
import { officeProposalsReply } from '@/lib/domain/calls/officeProposalSchema'
import { readOfficeProposals } from '@/lib/domain/calls/readOfficeProposals'
import { defineRoute } from '@/lib/http/defineRoute'

export const GET = defineRoute({
  name: 'GET /api/tables/office-proposals',
  query: z.object({ call: z.string().min(1).max(60) }),
  run: async (ctx, { query }) => officeProposalsReply.parse(await readOfficeProposals(ctx, query.call)),
})
