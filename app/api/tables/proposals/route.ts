import { listProposals } from '@/lib/domain/proposals/listProposals'
import { defineRoute } from '@/lib/http/defineRoute'

/** The reader's own proposals, for the table. */
export const GET = defineRoute({ name: 'GET /api/tables/proposals', run: (ctx) => listProposals(ctx) })
