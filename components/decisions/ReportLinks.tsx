import { linkClasses } from '@/components/ui/linkClasses'

export interface ReportLinksProps {
  pdf: string
  csv: string
}

/** The report of a panel as files; it rests on a frozen ranking. */
export function ReportLinks({ pdf, csv }: ReportLinksProps) {
  return (
    <p className="m-0 flex flex-wrap items-baseline gap-x-6 gap-y-2 text-table" data-no-print>
      <span className="text-muted">Report of the panel:</span>
      <a href={pdf} download className={linkClasses}>
        all of it as PDF
      </a>
      <a href={csv} download className={linkClasses}>
        the ranked table as CSV
      </a>
    </p>
  )
}
