import { z } from 'zod'
import { readFigure } from '@/lib/domain/writings/readFigure'
import { defineRoute } from '@/lib/http/defineRoute'
import { pictureResponse } from '@/lib/http/pictureResponse'

const params = z.object({
  reference: z.string().max(10),
  figure: z
    .string()
    .regex(/^\d{1,9}$/)
    .transform(Number),
})

/** The picture of a figure. */
export const GET = defineRoute({
  name: 'GET /proposals/[reference]/figures/[figure]',
  params,
  run: async (ctx, { params: { reference, figure } }) =>
    pictureResponse(await readFigure(ctx, { reference, figureId: figure })),
})
