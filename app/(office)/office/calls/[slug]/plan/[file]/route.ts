import { z } from 'zod'
import { planFile, planFileName } from '@/lib/domain/nightPlan/planFile'
import { readOfficePlan } from '@/lib/domain/nightPlan/readOfficePlan'
import { defineRoute } from '@/lib/http/defineRoute'
import { fileResponse } from '@/lib/http/fileResponse'
import { paths } from '@/lib/paths'

/** The night plan of a call as a file. */
export const GET = defineRoute({
  name: 'GET /office/calls/[slug]/plan/[file]',
  params: z.object({ slug: z.string().min(1).max(60), file: planFileName }),
  limit: { points: 60, seconds: 60 },
  run: async (ctx, { params }) => {
    const { origin } = ctx.request
    const plan = await readOfficePlan(ctx, params.slug)
    return fileResponse(
      planFile(plan, params.file, { origin, url: `${origin}${paths.officeCall(plan.callSlug)}` }),
    )
  },
})
