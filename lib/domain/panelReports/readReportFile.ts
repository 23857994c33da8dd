import { createElement } from 'react'
import { z } from 'zod'
import { ReportDocument } from '@/pdf/report/ReportDocument'
import { render } from '@/pdf/render'
import type { ActingContext } from '../context'
import { openPanel } from '../panels/openPanel'
import { officeDesk } from './officeDesk'
import { reportCsv } from './reportCsv'
import { reportData } from './reportData'
import { reportFacts } from './reportFacts'

/** The forms a panel's report is handed out in. */
export const reportFileName = z.enum(['report.pdf', 'report.csv'])
export type ReportFileName = z.output<typeof reportFileName>

export type ReportFile = { fileName: string } & ({ pdf: Uint8Array } | { csv: string })

/**
 * The report of a panel as a file, once its ranking is frozen: for whoever leads the panel, or, with `asOffice`, for the
 * office; to each without the proposals they have an interest in.
 */
export async function readReportFile(
  ctx: ActingContext,
  key: { callSlug: string; file: ReportFileName } & (
    { asOffice: true; panelId: number } | { asOffice: false; panelId?: number }
  ),
): Promise<ReportFile> {
  const desk = key.asOffice
    ? await officeDesk(ctx, key)
    : await openPanel(ctx, { callSlug: key.callSlug, panelId: key.panelId })
  const facts = await reportFacts(ctx, desk)
  const fileName = `call-${desk.call.number}-panel-${desk.panel.id}-${key.file}`
  if (key.file === 'report.csv') return { fileName, csv: reportCsv(facts) }
  const data = reportData(facts)
  return { fileName, pdf: await render(() => createElement(ReportDocument, { data })) }
}
