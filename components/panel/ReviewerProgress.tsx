'use client'

import { DataTable } from '@/components/tables/DataTable'
import type { TableColumn } from '@/components/tables/tableColumn'
import { Button } from '@/components/ui/Button'
import { EmptyState } from '@/components/ui/EmptyState'
import { ABSENT } from '@/lib/format'
import type { AssignmentsView, PanelReviewer } from '@/lib/domain/assignments/assignmentsView'
import { PagesBar } from './PagesBar'

export interface ReviewerProgressProps {
  view: AssignmentsView
  busy: string | null
  onRemind: (reviewer: PanelReviewer) => void
}

function columnsFor({ view, busy, onRemind }: ReviewerProgressProps): TableColumn<PanelReviewer>[] {
  const isLate = new Date(view.reviewsDueAt) < new Date()
  return [
    { id: 'name', head: 'Reviewer', value: (row) => row.name },
    {
      id: 'done',
      head: 'Finished',
      value: (row) => (row.proposals > 0 ? row.finished / row.proposals : null),
      cell: (row) =>
        row.proposals > 0 ? (
          <span className="inline-flex items-center gap-3">
            <PagesBar pages={row.finished} most={row.proposals} />
            {row.finished} of {row.proposals}
          </span>
        ) : (
          <span className="text-muted">nothing assigned</span>
        ),
      csv: (row) => row.finished,
    },
    { id: 'owed', head: 'Owed', align: 'right', value: (row) => row.owed.length },
    {
      id: 'which',
      head: 'Which',
      unit: isLate ? 'late now' : 'not finished',
      sortable: false,
      value: (row) => row.owed.join(', '),
      cell: (row) =>
        row.owed.length === 0
          ? ABSENT
          : row.owed.map((number, index) => (
              <span key={number} className="whitespace-nowrap">
                {index > 0 ? ' ' : ''}
                {number}
                {index < row.owed.length - 1 ? ', ' : ''}
              </span>
            )),
    },
    {
      id: 'names',
      head: 'List of names',
      value: (row) => (row.hasDeclared ? 'gone through' : 'not yet'),
    },
    {
      id: 'remind',
      head: 'Reminder',
      sortable: false,
      value: () => null,
      cell: (row) =>
        view.phase !== 'review' || row.owed.length === 0 ? (
          <span className="text-muted">{row.owed.length === 0 ? 'nothing owed' : 'while in review'}</span>
        ) : row.whyNotReminded ? (
          <span className="text-muted">{row.whyNotReminded}</span>
        ) : (
          <span className="-my-1.5 inline-block max-sm:my-0">
            <Button
              look="secondary"
              size="small"
              busy={busy === `remind-${row.personId}`}
              busyWord="Writing"
              onClick={() => onRemind(row)}
            >
              Remind
            </Button>
          </span>
        ),
    },
  ]
}

/** Each reviewer with what is finished and owed, and a reminder. */
export function ReviewerProgress(props: ReviewerProgressProps) {
  return (
    <DataTable
      caption="Progress by reviewer"
      columns={columnsFor(props)}
      rows={props.view.reviewers.filter((row) => row.mayReview || row.proposals > 0)}
      rowId={(row) => String(row.personId)}
      chips={[{ id: 'owes', label: 'Owes reviews', matches: (row) => row.owed.length > 0 }]}
      csv={`progress-call-${props.view.callNumber}`}
      urlPrefix="reviewers"
      phone="cards"
      empty={<EmptyState title="Nobody reviews yet">The office invites reviewers to the panel.</EmptyState>}
    />
  )
}
