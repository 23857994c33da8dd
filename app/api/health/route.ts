import { readHealth } from '@/lib/domain/health/readHealth'
import { defineRoute } from '@/lib/http/defineRoute'

export const GET = defineRoute({
  name: 'GET /api/health',
  run: async (ctx) => {
    const health = await readHealth(ctx)
    return Response.json(health, {
      status: health.status === 'up' ? 200 : 503,
      headers: { 'cache-control': 'no-store' },
    })
  },
})
