'use client'

import { useMemo } from 'react'
import { DataTable } from '@/components/tables/DataTable'
import type { TableColumn } from '@/components/tables/tableColumn'
import { EmptyState } from '@/components/ui/EmptyState'
import { TextLink } from '@/components/ui/TextLink'
import type { Seat } from '@/lib/domain/assignments/schema'
import type { AssignmentRow, AssignmentsView } from '@/lib/domain/assignments/assignmentsView'
import { formatNumber } from '@/lib/format'
import { paths } from '@/lib/paths'
import { AddReader } from './AddReader'
import { meanAffinity } from './affinityOf'
import type { AssignmentActions } from './assignmentActions'
import { DropPlace } from './DropPlace'
import { ReaderChip } from './ReaderChip'

type Pair = { proposalId: number; personId: number; seat: Seat }

export interface AssignmentsTableProps {
  view: AssignmentsView
  canAssign: boolean
  suggested: readonly Pair[]
  onAdd: (pair: Pair, words: string) => void
  onTakeOff: (pair: Pair, assignmentId: number, words: string) => void
  onSeat: (assignmentId: number, seat: Seat) => void
  replace: AssignmentActions['replace']
}

const order: readonly Seat[] = ['first', 'second', 'reader']

/** One row a proposal: its readers by name, those suggested dashed, and a way to add one. */
export function AssignmentsTable(props: AssignmentsTableProps) {
  const { view, suggested } = props
  const columns = useMemo<TableColumn<AssignmentRow>[]>(() => {
    const nameOf = (personId: number) =>
      view.reviewers.find((reviewer) => reviewer.personId === personId)?.name ?? 'former member'
    return [
      {
        id: 'number',
        head: 'Review',
        unit: 'number',
        value: (row) => row.reviewNumber,
        cell: (row) => (
          <span className="whitespace-nowrap">
            <TextLink href={paths.panelPacket(view.callSlug, row.reviewNumber)} plain strong>
              {row.reviewNumber}
            </TextLink>
          </span>
        ),
      },
      { id: 'title', head: 'Title', value: (row) => row.title },
      { id: 'pages', head: 'Pages', align: 'right', value: (row) => row.pages },
      { id: 'count', head: 'Readers', align: 'right', value: (row) => row.readers.length },
      {
        id: 'affinity',
        head: 'Affinity',
        unit: 'mean',
        align: 'right',
        value: (row) => meanAffinity(view, row),
        cell: (row) => formatNumber(meanAffinity(view, row), 2),
      },
      {
        id: 'readers',
        head: 'Who reads it',
        unit: 'first reader, second voice, then the others',
        sortable: false,
        wide: true,
        value: (row) => row.readers.map((reader) => nameOf(reader.personId)).join(', '),
        cell: (row) => (
          <DropPlace view={view} row={row}>
            {[...row.readers]
              .sort((a, b) => order.indexOf(a.seat) - order.indexOf(b.seat))
              .map((reader) => (
                <ReaderChip
                  key={reader.assignmentId}
                  row={row}
                  reader={reader}
                  name={nameOf(reader.personId)}
                  {...props}
                />
              ))}
            {suggested
              .filter((pair) => pair.proposalId === row.proposalId)
              .map((pair) => (
                <span
                  key={pair.personId}
                  className="rounded border border-dashed border-edge px-2 py-0.5 text-muted"
                >
                  {nameOf(pair.personId)}
                </span>
              ))}
            {props.canAssign ? <AddReader row={row} {...props} /> : null}
          </DropPlace>
        ),
      },
    ]
  }, [view, suggested, props])
  return (
    <DataTable
      caption={`Assignments of call ${view.callNumber}`}
      columns={columns}
      rows={view.rows}
      rowId={(row) => String(row.proposalId)}
      find="Number, title or reviewer"
      csv={`assignments-call-${view.callNumber}`}
      phone="cards"
      chips={[{ id: 'short', label: 'Too few readers', matches: (row) => row.readers.length < view.quorum }]}
      empty={
        <EmptyState title="No proposals here">
          Proposals come to the panel once they are sent in. There are none yet.
        </EmptyState>
      }
    />
  )
}
