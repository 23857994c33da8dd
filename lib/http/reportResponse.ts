import type { ReportFile } from '@/lib/domain/panelReports/readReportFile'
import { fileResponse } from './fileResponse'
import { pdfResponse } from './pdfResponse'

/** A panel's report as a download, in the form it was asked for. */
export const reportResponse = (file: ReportFile): Response =>
  'pdf' in file
    ? pdfResponse({ bytes: file.pdf, fileName: file.fileName })
    : fileResponse({ text: file.csv, type: 'text/csv; charset=utf-8', name: file.fileName })
