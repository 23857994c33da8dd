import { z } from 'zod'
import { maxFormBytes } from '@/lib/domain/objects/limits'
import { replacePaper } from '@/lib/domain/papers/replacePaper'
import { uploadPaperSchema } from '@/lib/domain/papers/schema'
import { stampArrival } from '@/lib/domain/submission/stampArrival'
import { defineRoute } from '@/lib/http/defineRoute'

/** Takes the right document of a sent proposal, which the office has opened for it. */
export const POST = defineRoute({
  name: 'POST /proposals/[reference]/papers/replacement',
  params: z.object({ reference: uploadPaperSchema.shape.reference }),
  form: uploadPaperSchema.omit({ reference: true }),
  maxBytes: maxFormBytes,
  limit: { points: 20, seconds: 3600 },
  run: async (ctx, { params, form }) =>
    // The file is here whole: this is when it arrived.
    replacePaper(ctx, { ...form, ...params }, await stampArrival(ctx.db)),
})
