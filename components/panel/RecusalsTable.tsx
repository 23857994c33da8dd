'use client'

import { DataTable } from '@/components/tables/DataTable'
import { EmptyState } from '@/components/ui/EmptyState'
import type { AssignmentsView } from '@/lib/domain/assignments/assignmentsView'
import { formatUtc } from '@/lib/format'

type Row = AssignmentsView['recusals'][number]

/** Who left what they were given because of an interest, when and why. */
export function RecusalsTable({ view }: { view: AssignmentsView }) {
  return (
    <DataTable<Row>
      caption={`Reviews left in call ${view.callNumber}`}
      columns={[
        { id: 'number', head: 'Review', value: (row) => row.reviewNumber },
        { id: 'name', head: 'Reviewer', value: (row) => row.name },
        { id: 'why', head: 'Why', value: (row) => row.reason },
        { id: 'at', head: 'When', value: (row) => row.at, cell: (row) => formatUtc(new Date(row.at)) },
      ]}
      rows={view.recusals}
      rowId={(row) => `${row.reviewNumber}-${row.name}-${row.at}`}
      urlPrefix="left"
      csv={`left-call-${view.callNumber}`}
      phone="cards"
      empty={
        <EmptyState title="Nobody has left a review">Whoever finds an interest late stands here.</EmptyState>
      }
    />
  )
}
