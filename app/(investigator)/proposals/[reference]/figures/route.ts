import { z } from 'zod'
import { maxFormBytes } from '@/lib/domain/objects/limits'
import { uploadFigureSchema } from '@/lib/domain/writings/schema'
import { uploadFigure } from '@/lib/domain/writings/uploadFigure'
import { defineRoute } from '@/lib/http/defineRoute'

/** Takes a picture as a new figure of the justification, or in the place of one that stands. */
export const POST = defineRoute({
  name: 'POST /proposals/[reference]/figures',
  params: z.object({ reference: uploadFigureSchema.shape.reference }),
  form: uploadFigureSchema.omit({ reference: true }),
  maxBytes: maxFormBytes,
  limit: { points: 60, seconds: 3600 },
  run: (ctx, { params, form }) => uploadFigure(ctx, { ...form, ...params }),
})
