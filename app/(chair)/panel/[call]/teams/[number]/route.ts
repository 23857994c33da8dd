import { z } from 'zod'
import { readTeamPaper } from '@/lib/domain/panels/readTeamPaper'
import { defineRoute } from '@/lib/http/defineRoute'
import { inlinePdf } from '@/lib/http/inlinePdf'

/** Who asks, apart from the packet; refused before the ranking is frozen. */
export const GET = defineRoute({
  name: 'GET /panel/[call]/teams/[number]',
  params: z.object({ call: z.string().min(1).max(60), number: z.string().max(8) }),
  limit: { points: 60, seconds: 60 },
  run: async (ctx, { params }) => {
    const { bytes, fileName } = await readTeamPaper(ctx, {
      callSlug: params.call,
      reviewNumber: params.number,
    })
    return inlinePdf(bytes, fileName)
  },
})
