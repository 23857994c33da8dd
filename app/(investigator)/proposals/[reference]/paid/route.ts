import { z } from 'zod'
import { confirmPayment } from '@/lib/domain/fees/confirmPayment'
import { defineRoute } from '@/lib/http/defineRoute'
import { paths } from '@/lib/paths'

/** Where the payment firm sends people back to: its own word is asked for, since its notice may still be on the way. */
export const GET = defineRoute({
  name: 'GET /proposals/[reference]/paid',
  params: z.object({ reference: z.string() }),
  run: async (ctx, { params }) => {
    await confirmPayment(ctx, params)
    const to = new URL(paths.proposalSent(params.reference), ctx.request.origin)
    return new Response(null, { status: 303, headers: { location: to.href, 'cache-control': 'no-store' } })
  },
})
