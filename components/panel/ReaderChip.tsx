'use client'

import { GripVertical } from 'lucide-react'
import { Button } from '@/components/ui/Button'
import { classNames } from '@/components/ui/classNames'
import { Popover } from '@/components/ui/Popover'
import type { Seat } from '@/lib/domain/assignments/schema'
import type { AssignmentRow } from '@/lib/domain/assignments/assignmentsView'
import { DragHandle } from './DragHandle'
import { AffinityMark } from './AffinityMark'
import { affinityOf } from './affinityOf'
import type { AssignmentsTableProps } from './AssignmentsTable'
import { ReplaceForm } from './ReplaceForm'

const seatWords: Record<Seat, string> = { first: 'first reader', second: 'second voice', reader: 'reader' }
const stateWords = { 'to-read': 'not begun', begun: 'begun', finished: 'finished' } as const

export interface ReaderChipProps extends Pick<
  AssignmentsTableProps,
  'view' | 'canAssign' | 'onTakeOff' | 'onSeat' | 'replace'
> {
  row: AssignmentRow
  reader: AssignmentRow['readers'][number]
  name: string
}

/** A reader by name; opened: how far the review is, the seat, taking off, replacing. */
export function ReaderChip(props: ReaderChipProps) {
  const { row, reader, name, view, canAssign, onTakeOff, onSeat, replace } = props
  const { assignmentId, seat, state, personId } = reader
  return (
    <span
      className={classNames(
        'inline-flex items-stretch rounded border',
        seat === 'reader' ? 'border-rule' : 'border-edge',
      )}
    >
      {canAssign && state !== 'finished' ? (
        <DragHandle
          reader={{
            personId,
            name,
            from: { assignmentId, proposalId: row.proposalId, reviewNumber: row.reviewNumber },
          }}
          label={`Move ${name} from ${row.reviewNumber} to another proposal`}
          className="inline-flex min-h-6 w-6 items-center justify-center border-r border-rule text-muted hover:bg-wash max-md:hidden"
        >
          <GripVertical size={12} aria-hidden="true" />
        </DragHandle>
      ) : null}
      <Popover
        label={`${name} reads ${row.reviewNumber}`}
        trigger={
          <button
            type="button"
            className={classNames(
              'px-2 py-0.5 text-left hover:bg-wash max-sm:min-h-11',
              seat !== 'reader' && 'font-semibold',
            )}
          >
            {name}
            {seat === 'reader' ? null : (
              <span className="font-normal text-muted">, {seat === 'first' ? 'first' : 'second'}</span>
            )}
          </button>
        }
      >
        <p className="m-0 font-semibold">{name}</p>
        <p className="m-0 text-muted">
          {seatWords[seat]} of {row.reviewNumber}, review {stateWords[state]}
        </p>
        <p className="m-0 text-muted">
          Its subject: <AffinityMark affinity={affinityOf(view, row, personId)} />
        </p>
        <div className="mt-3 flex flex-wrap gap-2">
          {(['first', 'second', 'reader'] as const)
            .filter((other) => other !== seat)
            .map((other) => (
              <Button key={other} look="secondary" size="small" onClick={() => onSeat(assignmentId, other)}>
                {`Make ${seatWords[other]}`}
              </Button>
            ))}
          {canAssign && state !== 'finished' ? (
            <Button
              look="secondary"
              size="small"
              onClick={() =>
                onTakeOff(
                  { proposalId: row.proposalId, personId, seat },
                  assignmentId,
                  `${name} no longer reads ${row.reviewNumber}`,
                )
              }
            >
              Take off
            </Button>
          ) : null}
        </div>
        {canAssign && state !== 'finished' ? (
          <ReplaceForm view={view} row={row} assignmentId={assignmentId} name={name} action={replace} />
        ) : null}
      </Popover>
    </span>
  )
}
