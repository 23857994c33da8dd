import { z } from 'zod'
import { readPanelPacket } from '@/lib/domain/panels/readPanelPacket'
import { defineRoute } from '@/lib/http/defineRoute'
import { inlinePdf } from '@/lib/http/inlinePdf'

export const GET = defineRoute({
  name: 'GET /panel/[call]/packets/[number]',
  params: z.object({ call: z.string().min(1).max(60), number: z.string().max(8) }),
  limit: { points: 60, seconds: 60 },
  run: async (ctx, { params }) => {
    const { bytes, fileName } = await readPanelPacket(ctx, {
      callSlug: params.call,
      reviewNumber: params.number,
    })
    return inlinePdf(bytes, fileName)
  },
})
