'use client'

import { DataTable } from '@/components/tables/DataTable'
import type { TableColumn } from '@/components/tables/tableColumn'
import { EmptyState } from '@/components/ui/EmptyState'
import type { PanelReviewer } from '@/lib/domain/assignments/assignmentsView'
import { formatNumber } from '@/lib/format'
import { PagesBar } from './PagesBar'

const sum = (rows: readonly PanelReviewer[], pick: (row: PanelReviewer) => number) =>
  rows.reduce((total, row) => total + pick(row), 0)

const columnsFor = (most: number): TableColumn<PanelReviewer>[] => [
  { id: 'name', head: 'Reviewer', value: (row) => row.name },
  { id: 'number', head: 'Number', unit: 'elsewhere', align: 'right', value: (row) => row.number },
  {
    id: 'interests',
    head: 'List of names',
    value: (row) => (row.mayReview ? (row.hasDeclared ? 'gone through' : 'not yet') : 'does not review'),
  },
  {
    id: 'stated',
    head: 'What they know',
    value: (row) => (row.mayReview ? (row.hasStated ? 'said' : 'not yet') : ''),
  },
  {
    id: 'proposals',
    head: 'Proposals',
    align: 'right',
    value: (row) => row.proposals,
    total: (rows) => formatNumber(sum(rows, (row) => row.proposals)),
  },
  {
    id: 'pages',
    head: 'Pages',
    align: 'right',
    value: (row) => row.pages,
    total: (rows) => formatNumber(sum(rows, (row) => row.pages)),
  },
  {
    id: 'load',
    head: 'Load',
    sortable: false,
    value: (row) => row.pages,
    cell: (row) => <PagesBar pages={row.pages} most={most} />,
  },
]

/** Loads by pages, so that nobody reads twice as much as the others. */
export function ReviewerLoads({ reviewers }: { reviewers: readonly PanelReviewer[] }) {
  const most = Math.max(1, ...reviewers.map((reviewer) => reviewer.pages))
  return (
    <DataTable
      caption="Loads of the reviewers"
      columns={columnsFor(most)}
      rows={reviewers}
      rowId={(row) => String(row.personId)}
      urlPrefix="loads"
      phone="cards"
      empty={
        <EmptyState title="Nobody sits on this panel">The office invites reviewers to the panel.</EmptyState>
      }
    />
  )
}
