'use client'

import { DataTable } from '@/components/tables/DataTable'
import type { TableColumn } from '@/components/tables/tableColumn'
import { VerdictMark } from '@/components/ui/VerdictMark'
import type { FeasibilityCheck } from '@/lib/domain/observations/types'

const columns: readonly TableColumn<FeasibilityCheck>[] = [
  { id: 'check', head: 'Check', value: ({ name }) => name, sortable: false },
  { id: 'measured', head: 'Measured', align: 'right', value: ({ measured }) => measured, sortable: false },
  {
    id: 'feasible-to',
    head: 'Feasible to',
    align: 'right',
    value: ({ feasibleTo }) => feasibleTo,
    cell: ({ feasibleTo }) => <span className="text-muted">{feasibleTo}</span>,
    sortable: false,
  },
  {
    id: 'fails-at',
    head: 'Fails at',
    align: 'right',
    value: ({ failsAt }) => failsAt,
    cell: ({ failsAt }) => <span className="text-muted">{failsAt}</span>,
    sortable: false,
  },
  {
    id: 'verdict',
    head: 'Verdict',
    value: ({ verdict }) => verdict,
    cell: ({ verdict }) => (
      <span className="whitespace-nowrap">
        <VerdictMark verdict={verdict} />
      </span>
    ),
    sortable: false,
  },
  {
    id: 'why',
    head: 'Why, and what would fix it',
    value: ({ why, fix }) => (fix ? `${why} ${fix}` : why),
    cell: ({ why, fix }) => (
      <span className="block text-left">
        {why}
        {fix ? (
          <span className="mt-1 block">
            <strong>What would fix it:</strong> {fix}
          </span>
        ) : null}
      </span>
    ),
    sortable: false,
  },
]

export interface ReportChecksProps {
  name: string
  checks: readonly FeasibilityCheck[]
  fileName: string
}

/** Every check with its own two limits; what is not clear is lit and says what would fix it. */
export function ReportChecks({ name, checks, fileName }: ReportChecksProps) {
  return (
    <DataTable
      caption={`Checks of ${name}`}
      columns={columns}
      rows={checks}
      rowId={({ id }) => id}
      csv={fileName}
      tone={({ verdict }) => (verdict === 'feasible' ? null : verdict)}
      phone="cards"
      urlPrefix="checks"
    />
  )
}
