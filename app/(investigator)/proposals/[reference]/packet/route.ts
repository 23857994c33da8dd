import { z } from 'zod'
import { readPacket } from '@/lib/domain/packets/readPacket'
import { defineRoute } from '@/lib/http/defineRoute'
import { pdfResponse } from '@/lib/http/pdfResponse'

/** The packet with names; `?variant=anonymised` as the panel reads it. */
export const GET = defineRoute({
  name: 'GET /proposals/[reference]/packet',
  params: z.object({ reference: z.string() }),
  query: z.object({ variant: z.enum(['full', 'anonymised'], 'Give full or anonymised.').default('full') }),
  limit: { points: 30, seconds: 300 },
  run: async (ctx, { params, query }) =>
    pdfResponse(await readPacket(ctx, { reference: params.reference, variant: query.variant })),
})
