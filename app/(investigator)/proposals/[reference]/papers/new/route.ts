import { z } from 'zod'
import { maxFormBytes } from '@/lib/domain/objects/limits'
import { uploadPaper } from '@/lib/domain/papers/uploadPaper'
import { uploadPaperSchema } from '@/lib/domain/papers/schema'
import { defineRoute } from '@/lib/http/defineRoute'

/** Takes a document of a proposal, in the place of the one that stood. */
export const POST = defineRoute({
  name: 'POST /proposals/[reference]/papers/new',
  params: z.object({ reference: uploadPaperSchema.shape.reference }),
  form: uploadPaperSchema.omit({ reference: true }),
  maxBytes: maxFormBytes,
  limit: { points: 20, seconds: 3600 },
  run: (ctx, { params, form }) => uploadPaper(ctx, { ...form, ...params }),
})
