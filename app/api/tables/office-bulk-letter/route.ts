import { z } from 'zod'
import { readBulkProgress } from '@/lib/domain/bulkLetters/readBulkProgress'
import { bulkProgressReply } from '@/lib/domain/bulkLetters/schema'
import { defineRoute } from '@/lib/http/defineRoute'

export const GET = defineRoute({
  name: 'GET /api/tables/office-bulk-letter',
  query: z.object({ id: z.string().regex(/^\d{1,9}$/, 'A letter is given by a number.') }),
  run: async (ctx, { query }) => bulkProgressReply.parse(await readBulkProgress(ctx, Number(query.id))),
})
