import type { ReactNode } from 'react'
import { KeyFigure } from '@/components/ui/KeyFigure'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { policyNames, type NightsPolicy } from '@/lib/domain/decisions/policyWords'
import type { PolicySummary } from '@/lib/domain/decisions/policySummary'
import { formatHoursFromSeconds, formatNumber, formatPercent } from '@/lib/format'

const rules: Record<NightsPolicy, string> = {
  rank: 'Visits first, on dates of their own, down to the line. Then, in turn, what must have time before the others, each takes what it asked, or as much as its targets can use of what is left, if that is not less than its least useful award: what the chair set, else what the investigators say, else half of what was asked. Those above keep their hours and make room where they can.',
  merit:
    'Visits first, on dates of their own, down to the line. Then the awards, whole or in part, with the most merit times hours down to the line, merit being the raw mean; what must have time has its least at least. Then the others fill what remains, by rank.',
}

/** Behind a figure: how far from what no plan can exceed. */
function gapInWords(gap: number | null): string {
  if (gap === null) return ''
  return gap < 5e-5
    ? '; no plan of the queue has more'
    : `; no plan of the queue has ${formatPercent(gap, 2)} more`
}

export interface PolicyCardProps {
  summary: PolicySummary
  offeredSeconds: number
  isShown: boolean
  onShow: () => void
  /** What can be done with the one shown. */
  children?: ReactNode
}

/** One way to divide the nights and what it comes to; the one shown carries the thick rule. */
export function PolicyCard({ summary, offeredSeconds, isShown, onShow, children }: PolicyCardProps) {
  const name = policyNames[summary.policy]
  return (
    <section aria-label={name} className={`border-t-4 pt-3 ${isShown ? 'border-accent' : 'border-rule'}`}>
      <div className="flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1">
        <h2 className="text-section">{name}</h2>
        {isShown ? (
          <span className="text-table font-semibold text-accent">Shown below</span>
        ) : summary.why === null ? (
          <LinkLikeButton onClick={onShow}>Show this one</LinkLikeButton>
        ) : null}
      </div>
      <p className="mt-1 mb-3 text-table text-muted">{rules[summary.policy]}</p>
      {summary.why === null ? (
        <div className="flex flex-wrap gap-x-10 gap-y-3">
          <KeyFigure value={String(summary.awarded)} label="awarded, whole or in part" />
          <KeyFigure
            value={formatHoursFromSeconds(summary.seconds)}
            label={`of ${formatHoursFromSeconds(offeredSeconds)} on offer`}
          />
          <KeyFigure
            value={formatNumber(summary.meritHours, 0)}
            label={`merit × hours, down to the line${gapInWords(summary.gap)}`}
          />
        </div>
      ) : (
        <p className="m-0 text-table">No plan was found: {summary.why}</p>
      )}
      {children ? <div className="mt-4">{children}</div> : null}
    </section>
  )
}
