import { listModes } from '@/lib/domain/calculations/listModes'
import { defineRoute } from '@/lib/http/defineRoute'
import { jsonOrCsv } from '@/lib/http/jsonOrCsv'

export const GET = defineRoute({
  name: 'GET /api/v1/modes',
  limit: { points: 120, seconds: 60 },
  run: async (ctx, { request }) => {
    const modes = await listModes(ctx)
    return jsonOrCsv(request, { modes }, modes)
  },
})
