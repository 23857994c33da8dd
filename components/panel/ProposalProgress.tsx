'use client'

import { DataTable } from '@/components/tables/DataTable'
import type { TableColumn } from '@/components/tables/tableColumn'
import { EmptyState } from '@/components/ui/EmptyState'
import type { AssignmentRow, AssignmentsView } from '@/lib/domain/assignments/assignmentsView'

const of = (row: AssignmentRow, state: AssignmentRow['readers'][number]['state']) =>
  row.readers.filter((reader) => reader.state === state).length

const columns: TableColumn<AssignmentRow>[] = [
  { id: 'number', head: 'Review', unit: 'number', value: (row) => row.reviewNumber },
  { id: 'title', head: 'Title', value: (row) => row.title },
  { id: 'readers', head: 'Readers', align: 'right', value: (row) => row.readers.length },
  { id: 'finished', head: 'Finished', align: 'right', value: (row) => of(row, 'finished') },
  { id: 'begun', head: 'Begun', align: 'right', value: (row) => of(row, 'begun') },
  { id: 'open', head: 'Not begun', align: 'right', value: (row) => of(row, 'to-read') },
]

/** Each proposal with how many of its reviews are in. */
export function ProposalProgress({ view }: { view: AssignmentsView }) {
  return (
    <DataTable
      caption="Progress by proposal"
      columns={columns}
      rows={view.rows}
      rowId={(row) => String(row.proposalId)}
      find="Number or title"
      chips={[
        {
          id: 'waits',
          label: 'Waits',
          matches: (row) => row.readers.length === 0 || of(row, 'finished') < row.readers.length,
        },
      ]}
      tone={(row) => (of(row, 'finished') < Math.min(2, view.quorum) ? 'attention' : null)}
      csv={`reviews-call-${view.callNumber}`}
      urlPrefix="proposals"
      phone="cards"
      empty={<EmptyState title="No proposals here">Proposals come once they are sent in.</EmptyState>}
    />
  )
}
