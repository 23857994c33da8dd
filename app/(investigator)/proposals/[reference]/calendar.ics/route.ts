import { z } from 'zod'
import { readAwardedNights } from '@/lib/domain/decisions/readAwardedNights'
import { calendarOf } from '@/lib/domain/submission/calendarOf'
import { readSent } from '@/lib/domain/submission/readSent'
import { defineRoute } from '@/lib/http/defineRoute'

/** The dates of a sent proposal for a calendar, and the nights of its award. */
export const GET = defineRoute({
  name: 'GET /proposals/[reference]/calendar.ics',
  params: z.object({ reference: z.string() }),
  run: async (ctx, { params }) => {
    const sent = await readSent(ctx, params.reference)
    const awarded = await readAwardedNights(ctx, sent.contents)
    const { email } = ctx.actor
    return new Response(calendarOf({ sent, email, origin: ctx.request.origin, awarded }), {
      headers: {
        'content-type': 'text/calendar; charset=utf-8',
        'content-disposition': `attachment; filename="${sent.contents.reference}.ics"`,
        'cache-control': 'no-store',
      },
    })
  },
})
