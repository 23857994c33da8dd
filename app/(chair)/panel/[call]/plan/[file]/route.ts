import { z } from 'zod'
import { planFile, planFileName } from '@/lib/domain/nightPlan/planFile'
import { readPanelPlan } from '@/lib/domain/nightPlan/readPanelPlan'
import { panelNumber } from '@/lib/domain/panels/schema'
import { defineRoute } from '@/lib/http/defineRoute'
import { fileResponse } from '@/lib/http/fileResponse'
import { paths } from '@/lib/paths'

/** The night plan of a panel as a file. */
export const GET = defineRoute({
  name: 'GET /panel/[call]/plan/[file]',
  params: z.object({ call: z.string().min(1).max(60), file: planFileName }),
  query: z.object({ panel: panelNumber.optional() }),
  limit: { points: 60, seconds: 60 },
  run: async (ctx, { params, query }) => {
    const { origin } = ctx.request
    const plan = await readPanelPlan(ctx, { callSlug: params.call, panelId: query.panel })
    const url = `${origin}${paths.panel(plan.callSlug, 'nights', query.panel)}`
    return fileResponse(planFile(plan, params.file, { origin, url }))
  },
})
