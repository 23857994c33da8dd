import { z } from 'zod'
import { calendarOf } from '@/lib/domain/submission/calendarOf'
import { readSent } from '@/lib/domain/submission/readSent'
import { defineRoute } from '@/lib/http/defineRoute'

/** The dates of a sent proposal for a calendar. */
export const GET = defineRoute({
  name: 'GET /proposals/[reference]/calendar.ics',
  params: z.object({ reference: z.string() }),
  run: async (ctx, { params }) => {
    const sent = await readSent(ctx, params.reference)
    return new Response(calendarOf(sent, ctx.actor.email, ctx.request.origin), {
      headers: {
        'content-type': 'text/calendar; charset=utf-8',
        'content-disposition': `attachment; filename="${sent.contents.reference}.ics"`,
        'cache-control': 'no-store',
      },
    })
  },
})
