import { defineRoute } from '@/lib/http/defineRoute'
import { jsonOrCsv } from '@/lib/http/jsonOrCsv'
import { listCosmologies } from '@/lib/domain/calculations/listCosmologies'

export const GET = defineRoute({
  name: 'GET /api/v1/cosmologies',
  limit: { points: 120, seconds: 60 },
  run: async (_, { request }) => {
    const cosmologies = listCosmologies()
    return jsonOrCsv(request, { cosmologies }, cosmologies)
  },
})
