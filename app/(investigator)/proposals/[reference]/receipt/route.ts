import { z } from 'zod'
import { readReceipt } from '@/lib/domain/fees/readReceipt'
import { defineRoute } from '@/lib/http/defineRoute'
import { pdfResponse } from '@/lib/http/pdfResponse'

/** The receipt of a fee. */
export const GET = defineRoute({
  name: 'GET /proposals/[reference]/receipt',
  params: z.object({ reference: z.string() }),
  limit: { points: 30, seconds: 300 },
  run: async (ctx, { params }) => pdfResponse(await readReceipt(ctx, params.reference)),
})
