import { z } from 'zod'
import { readPaper } from '@/lib/domain/papers/readPaper'
import { defineRoute } from '@/lib/http/defineRoute'
import { pdfResponse } from '@/lib/http/pdfResponse'

const params = z.object({
  reference: z.string().max(10),
  paper: z
    .string()
    .regex(/^\d{1,9}$/)
    .transform(Number),
})

/** A document of a proposal, to be kept as a file: never shown as a page of ours. */
export const GET = defineRoute({
  name: 'GET /proposals/[reference]/papers/[paper]',
  params,
  run: async (ctx, { params: { reference, paper } }) =>
    pdfResponse(await readPaper(ctx, { reference, paperId: paper })),
})
