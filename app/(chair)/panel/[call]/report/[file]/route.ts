import { z } from 'zod'
import { readReportFile, reportFileName } from '@/lib/domain/panelReports/readReportFile'
import { panelNumber } from '@/lib/domain/panels/schema'
import { defineRoute } from '@/lib/http/defineRoute'
import { reportResponse } from '@/lib/http/reportResponse'

/** The report of a panel, for whoever leads it. */
export const GET = defineRoute({
  name: 'GET /panel/[call]/report/[file]',
  params: z.object({ call: z.string().min(1).max(60), file: reportFileName }),
  query: z.object({ panel: panelNumber.optional() }),
  limit: { points: 60, seconds: 60 },
  run: async (ctx, { params, query }) =>
    reportResponse(
      await readReportFile(ctx, {
        ...{ callSlug: params.call, file: params.file, panelId: query.panel },
        asOffice: false,
      }),
    ),
})
