import { z } from 'zod'
import { readSample } from '@/lib/domain/outbox/readSample'
import { refuse } from '@/lib/errors'
import { defineRoute } from '@/lib/http/defineRoute'
import { letterResponse } from '@/lib/http/letterResponse'

/** A letter tried on a real proposal, as a mail program shows it. */
export const GET = defineRoute({
  name: 'GET /office/mail/templates/html',
  query: z.object({ template: z.string().max(60), reference: z.string().max(20) }),
  run: async (ctx, { query }) => {
    const { letter } = await readSample(ctx, query)
    if (!letter) throw refuse.notFound('letter')
    return letterResponse(letter.html)
  },
})
