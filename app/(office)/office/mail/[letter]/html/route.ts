import { z } from 'zod'
import { readLetter } from '@/lib/domain/outbox/readLetter'
import { defineRoute } from '@/lib/http/defineRoute'
import { letterResponse } from '@/lib/http/letterResponse'

/** A letter of the outbox as a mail program shows it. */
export const GET = defineRoute({
  name: 'GET /office/mail/[letter]/html',
  params: z.object({ letter: z.string().regex(/^\d{1,9}$/, 'A letter is given by a number.') }),
  run: async (ctx, { params }) => letterResponse((await readLetter(ctx, Number(params.letter))).html),
})
