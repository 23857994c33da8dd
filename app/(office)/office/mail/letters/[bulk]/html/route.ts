import { z } from 'zod'
import { readBulkLetter } from '@/lib/domain/bulkLetters/readBulkLetter'
import { refuse } from '@/lib/errors'
import { defineRoute } from '@/lib/http/defineRoute'
import { letterResponse } from '@/lib/http/letterResponse'

const number = z.string().regex(/^\d{1,9}$/, 'It is given by a number.')

/** A letter to many as one of those it is for gets it. */
export const GET = defineRoute({
  name: 'GET /office/mail/letters/[bulk]/html',
  params: z.object({ bulk: number }),
  query: z.object({ reader: number.optional(), v: z.string().optional() }),
  run: async (ctx, { params, query }) => {
    const { shown } = await readBulkLetter(
      ctx,
      Number(params.bulk),
      query.reader ? Number(query.reader) : null,
    )
    if (!shown) throw refuse.notFound('letter')
    return letterResponse(shown.html)
  },
})
