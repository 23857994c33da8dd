import { readBill } from '@/lib/domain/fees/readBill'
import { billParams } from '@/lib/domain/fees/schema'
import { defineRoute } from '@/lib/http/defineRoute'
import { pdfResponse } from '@/lib/http/pdfResponse'

/** An invoice or a credit note. */
export const GET = defineRoute({
  name: 'GET /proposals/[reference]/bills/[number]',
  params: billParams,
  limit: { points: 30, seconds: 300 },
  run: async (ctx, { params }) => pdfResponse(await readBill(ctx, params)),
})
