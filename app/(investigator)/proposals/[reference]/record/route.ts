import { z } from 'zod'
import { readRecord } from '@/lib/domain/submission/readRecord'
import { defineRoute } from '@/lib/http/defineRoute'
import { pdfResponse } from '@/lib/http/pdfResponse'

/** The record of a sending, to keep. */
export const GET = defineRoute({
  name: 'GET /proposals/[reference]/record',
  params: z.object({ reference: z.string() }),
  limit: { points: 30, seconds: 300 },
  run: async (ctx, { params }) => pdfResponse(await readRecord(ctx, params.reference)),
})
