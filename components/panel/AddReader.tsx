'use client'

import { Plus } from 'lucide-react'
import { Popover } from '@/components/ui/Popover'
import { countInWords } from '@/lib/format'
import type { AssignmentRow } from '@/lib/domain/assignments/assignmentsView'
import { AffinityMark } from './AffinityMark'
import { affinityOf } from './affinityOf'
import type { AssignmentsTableProps } from './AssignmentsTable'
import { freeReviewers } from './freeReviewers'
import { nextSeat } from './nextSeat'

export interface AddReaderProps extends Pick<AssignmentsTableProps, 'view' | 'onAdd'> {
  row: AssignmentRow
}

/** Adds a reader: who may, nearest to the subject first; who may not, and why. */
export function AddReader({ view, row, onAdd }: AddReaderProps) {
  const free = freeReviewers(view, row)
  const nameOf = (personId: number) =>
    view.reviewers.find((reviewer) => reviewer.personId === personId)?.name ?? ''
  return (
    <Popover
      label={`Add a reader to ${row.reviewNumber}`}
      trigger={
        <button
          type="button"
          aria-label={`Add a reader to ${row.reviewNumber}`}
          className="inline-flex size-7 items-center justify-center rounded border border-edge hover:bg-wash max-sm:size-11"
        >
          <Plus size={14} aria-hidden="true" />
        </button>
      }
    >
      <p className="m-0 font-semibold">Who reads {row.reviewNumber}?</p>
      <ul className="plain-list mt-2 max-h-64 overflow-y-auto">
        {free.map((reviewer) => (
          <li key={reviewer.personId}>
            <button
              type="button"
              className="flex min-h-8 w-full items-baseline justify-between gap-4 border-t border-rule py-1 text-left hover:bg-wash max-sm:min-h-11"
              onClick={() =>
                onAdd(
                  { proposalId: row.proposalId, personId: reviewer.personId, seat: nextSeat(row) },
                  `${reviewer.name} reads ${row.reviewNumber}`,
                )
              }
            >
              <span>
                {reviewer.name}
                <span className="block text-caption text-muted">
                  <AffinityMark affinity={affinityOf(view, row, reviewer.personId)} />
                </span>
              </span>
              <span className="shrink-0 text-muted">
                {countInWords(reviewer.proposals, 'proposal')}, {countInWords(reviewer.pages, 'page')}
              </span>
            </button>
          </li>
        ))}
      </ul>
      {free.length === 0 ? <p className="mt-2 text-muted">Nobody is left who may read it.</p> : null}
      {row.interests.length > 0 ? (
        <ul className="plain-list mt-3 border-t border-rule pt-2 text-caption text-muted">
          {row.interests.map((interest) => (
            <li key={interest.personId}>
              {nameOf(interest.personId)} {interest.words}.
            </li>
          ))}
        </ul>
      ) : null}
    </Popover>
  )
}
