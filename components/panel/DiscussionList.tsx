import Link from 'next/link'
import { classNames } from '@/components/ui/classNames'
import type { DiscussionView } from '@/lib/domain/rankings/readDiscussion'
import { isGrey } from '@/lib/domain/rankings/rules'
import { formatNumber } from '@/lib/format'

export interface DiscussionListProps {
  view: DiscussionView
  openId: number
  /** Where a proposal is discussed, by its review number. */
  addressOf: (reviewNumber: string) => string
}

/** The proposals in order, the line through them; one is open beside. */
export function DiscussionList({ view, openId, addressOf }: DiscussionListProps) {
  const { line } = view.ranking
  return (
    <nav aria-label="Proposals in order" className="min-w-0">
      <ol className="plain-list text-table rule-open max-lg:max-h-64 max-lg:overflow-y-auto max-lg:border-b max-lg:border-b-rule">
        {view.proposals.map((one) => (
          <li
            key={one.proposalId}
            className={one.rank === line ? 'border-b-2 border-lamp' : 'border-b border-rule'}
          >
            <Link
              href={addressOf(one.reviewNumber)}
              aria-current={one.proposalId === openId ? 'true' : undefined}
              className={classNames(
                'flex items-baseline gap-3 py-2 no-underline hover:bg-wash max-sm:min-h-11',
                one.proposalId === openId && 'border-l-4 border-accent bg-wash pl-2',
                one.setAside && 'text-muted',
              )}
            >
              <span className="w-6 shrink-0 text-right text-muted">{one.rank}</span>
              <span className="shrink-0 font-semibold">{one.reviewNumber}</span>
              <span className="min-w-0 grow">{one.setAside ? 'set aside' : one.title}</span>
              <span className={isGrey(one.chance) ? 'font-semibold text-lamp' : undefined}>
                {formatNumber(one.raw, 2)}
              </span>
            </Link>
          </li>
        ))}
      </ol>
      <p className="mt-2 text-caption text-muted">
        Raw means at the right; in lamp, the grey zone of the line.
      </p>
    </nav>
  )
}
