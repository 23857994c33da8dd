'use client'

import { useQueryClient } from '@tanstack/react-query'
import { StepAside } from '@/components/reviews/StepAside'
import { SectionHeading } from '@/components/ui/SectionHeading'
import type { TableView } from '@/lib/domain/discussions/tableView'
import { formatHoursFromSeconds, formatUtcClock } from '@/lib/format'
import type { LeaveTableAction, ScoreAgainAction } from './meetingActions'
import { ScoreAgain } from './ScoreAgain'
import { ScoresAtTable } from './ScoresAtTable'

/** The proposal that is discussed now, with the scores as they move. */
export function OnTable({
  view,
  scoreAgain,
  leaveTable,
}: {
  view: TableView
  scoreAgain: ScoreAgainAction
  leaveTable: LeaveTableAction
}) {
  const client = useQueryClient()
  const { proposal, own, since } = view
  if (!proposal) return null
  return (
    <article aria-labelledby="on-table" className="min-w-0">
      <p className="m-0 text-table font-semibold text-lamp">
        Now discussing{since ? ` since ${formatUtcClock(new Date(since))}` : ''}
      </p>
      <h2 id="on-table" className="mt-1 text-h2">
        {proposal.reviewNumber} {proposal.title}
      </h2>
      <p className="mt-1 text-table text-muted">
        {proposal.lines
          .map((line) => `${line.instrument} ${formatHoursFromSeconds(line.seconds)}`)
          .join(', ')}
      </p>
      <p className="mt-2 mb-0 text-table">
        <StepAside
          reviewNumber={proposal.reviewNumber}
          then="Your screen goes blank for it at once; a review of yours no longer counts."
          leave={(values) =>
            leaveTable({ panelId: view.panelId, proposalId: proposal.proposalId, ...values })
          }
          onDone={() => void client.invalidateQueries({ queryKey: ['panel'] })}
        />
      </p>
      <div className="mt-6 grid gap-x-16 gap-y-8 lg:grid-cols-2">
        <section>
          <SectionHeading dense title="Scores" />
          <div className="mt-3">
            <ScoresAtTable view={view} />
          </div>
        </section>
        {own ? <ScoreAgain key={own.assignmentId} own={own} save={scoreAgain} /> : null}
      </div>
    </article>
  )
}
