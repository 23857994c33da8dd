import { TextLink } from '@/components/ui/TextLink'
import { VerdictMark } from '@/components/ui/VerdictMark'
import type { ReviewLine } from '@/lib/domain/reviews/types'
import { formatHoursFromSeconds } from '@/lib/format'
import { paths } from '@/lib/paths'

export interface PhoneDeskHeadProps {
  line: ReviewLine
  place: number
  of: number
  next: ReviewLine | null
}

/** On phones, above the tabs: which proposal, how far one is, what is next. */
export function PhoneDeskHead({ line, place, of, next }: PhoneDeskHeadProps) {
  return (
    <div className="flex flex-col gap-1 bg-surface px-gutter pt-4 pb-2 lg:hidden">
      <div className="flex items-baseline justify-between gap-4">
        <strong className="text-section">{line.reviewNumber}</strong>
        <span className="text-table">
          <span className="text-muted">
            {place} of {of}
          </span>{' '}
          {next ? <TextLink href={paths.review(next.assignmentId)}>Next to read</TextLink> : null}
        </span>
      </div>
      <div className="flex flex-wrap items-baseline justify-between gap-x-4">
        <span>
          {formatHoursFromSeconds(line.askedSeconds)}, {line.instruments}
        </span>
        {line.verdict ? <VerdictMark verdict={line.verdict} /> : null}
      </div>
    </div>
  )
}
