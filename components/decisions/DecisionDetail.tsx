'use client'

import { SectionHeading } from '@/components/ui/SectionHeading'
import type { ReactNode } from 'react'
import type { DecisionRow } from '@/lib/domain/decisions/decisionsView'
import { ApprovalNote, type ApproveAction } from './ApprovalNote'
import { CommentRow, type WithholdAction } from './CommentRow'
import { FlagList } from './FlagList'
import { useOpening, type OpenAction } from './useOpening'

export interface DecisionDetailProps {
  row: DecisionRow
  panelId: number
  approve: ApproveAction
  openDecision: OpenAction
  /** Goes on to the next one not opened; null where this was the last. */
  onNext: (() => void) | null
  withhold: WithholdAction | null
  /** The statement, read or edited. */
  children: ReactNode
}

/** One decision opened: its words with what deserves a second look, the comments beside, and who approved it. */
export function DecisionDetail(props: DecisionDetailProps) {
  const { row, panelId, approve, openDecision, onNext, withhold, children } = props
  useOpening(row, panelId, openDecision)
  return (
    <div className="grid gap-x-16 gap-y-8 py-2 lg:grid-cols-[minmax(0,1fr)_24rem]">
      <div className="min-w-0">
        {children}
        {row.flags.length > 0 ? (
          <section className="mt-4" aria-label="To look at again">
            <p className="m-0 text-caption font-semibold">To look at again, as last kept</p>
            <FlagList text={row.statement} flags={row.flags} />
          </section>
        ) : null}
      </div>
      <div className="flex min-w-0 flex-col gap-8 text-table">
        <section>
          <SectionHeading dense title="Second person" />
          <div className="mt-2">
            <ApprovalNote row={row} panelId={panelId} approve={approve} onNext={onNext} />
          </div>
        </section>
        <section>
          <SectionHeading dense title="Comments the investigators read" />
          {row.comments.length === 0 ? <p className="mt-2 text-muted">None were written.</p> : null}
          <ul className="plain-list mt-2">
            {row.comments.map((comment) => (
              <CommentRow
                key={comment.assignmentId}
                comment={comment}
                row={row}
                panelId={panelId}
                withhold={withhold}
              />
            ))}
          </ul>
        </section>
      </div>
    </div>
  )
}
