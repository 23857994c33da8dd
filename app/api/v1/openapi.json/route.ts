import { describeApi } from '@/lib/domain/calculations/describeApi'
import { defineRoute } from '@/lib/http/defineRoute'

export const GET = defineRoute({
  name: 'GET /api/v1/openapi.json',
  limit: { points: 120, seconds: 60 },
  run: async () => describeApi(),
})
