import { z } from 'zod'
import { readRequestPacket } from '@/lib/domain/assessments/readRequestPacket'
import { requestKey } from '@/lib/domain/assessments/schema'
import { defineRoute } from '@/lib/http/defineRoute'
import { inlinePdf } from '@/lib/http/inlinePdf'

export const GET = defineRoute({
  name: 'GET /assessments/[request]/packet',
  params: z.object({ request: requestKey }),
  limit: { points: 60, seconds: 60 },
  run: async (ctx, { params }) => {
    const { bytes, fileName } = await readRequestPacket(ctx, params.request)
    return inlinePdf(bytes, fileName)
  },
})
