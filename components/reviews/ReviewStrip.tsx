import Link from 'next/link'
import { classNames } from '@/components/ui/classNames'
import type { ReviewLine } from '@/lib/domain/reviews/types'
import { formatNumber } from '@/lib/format'
import { paths } from '@/lib/paths'

export interface ReviewStripProps {
  callNumber: number
  lines: readonly ReviewLine[]
  currentId: number
}

function words(line: ReviewLine, isCurrent: boolean): string {
  if (line.state === 'finished') return `scored ${formatNumber(line.score, 1)}`
  if (isCurrent) return 'reading'
  return line.state === 'begun' ? 'begun' : 'to read'
}

/** The own assignments of a call in one line, above the desk. */
export function ReviewStrip({ callNumber, lines, currentId }: ReviewStripProps) {
  const finished = lines.filter(({ state }) => state === 'finished').length
  return (
    <nav aria-label="Your assignments" className="border-b border-rule bg-surface px-gutter max-lg:hidden">
      <div className="flex h-14 items-stretch overflow-x-auto overflow-y-hidden">
        <div className="flex shrink-0 flex-col justify-center pr-8">
          <span className="text-strip font-semibold">
            {finished} of {lines.length} finished
          </span>
          <Link href={paths.reviews()} className="text-tick text-muted no-underline hover:underline">
            Call {callNumber}
          </Link>
        </div>
        {lines.map((line) => {
          const isCurrent = line.assignmentId === currentId
          return (
            <Link
              key={line.assignmentId}
              href={paths.review(line.assignmentId)}
              aria-current={isCurrent ? 'page' : undefined}
              className={classNames(
                'flex shrink-0 flex-col justify-center border-l border-rule px-5 no-underline last:border-r focus-visible:-outline-offset-3',
                isCurrent ? 'bg-ink text-ground' : 'hover:bg-wash',
              )}
            >
              <span className="text-strip font-semibold">{line.reviewNumber}</span>
              <span className={classNames('text-tick', !isCurrent && 'text-muted')}>
                {words(line, isCurrent)}
              </span>
            </Link>
          )
        })}
      </div>
    </nav>
  )
}
