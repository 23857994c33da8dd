import { formatNumber } from '@/lib/format'

/** What the marks in the intervals mean. */
export function RankingKey({ draws, seed }: { draws: number; seed: number }) {
  return (
    <p className="mt-3 flex flex-wrap items-center gap-x-6 gap-y-1 text-caption text-muted">
      <span className="inline-flex items-center gap-2">
        <svg width="36" height="16" aria-hidden="true" focusable="false">
          <path d="M0 8H36" stroke="var(--s1)" strokeWidth="1.5" />
          <rect x="9" y="4.5" width="16" height="7" fill="var(--s1)" opacity="0.28" />
          <rect x="15" y="1" width="3" height="14" fill="var(--s1)" />
        </svg>
        rank by merit, middle half and 90 % of {formatNumber(draws)} draws (seed {seed})
      </span>
      <span className="inline-flex items-center gap-2">
        <svg width="2" height="16" aria-hidden="true" focusable="false">
          <rect width="1.2" height="16" fill="var(--ink-muted)" />
        </svg>
        rank by raw mean
      </span>
      <span className="inline-flex items-center gap-2">
        <svg width="14" height="12" aria-hidden="true" focusable="false">
          <rect width="14" height="12" fill="var(--lamp)" opacity="0.16" />
        </svg>
        grey zone of the line
      </span>
    </p>
  )
}
