'use client'

import { useMemo } from 'react'
import { DataTable } from '@/components/tables/DataTable'
import type { TableChip } from '@/components/tables/tableColumn'
import { useTableQuery } from '@/components/tables/useTableQuery'
import { proposalsReply, type ProposalsReply } from '@/lib/domain/proposals/tableSchema'
import { paths } from '@/lib/paths'
import { proposalColumns, type ListedRow } from './proposalColumns'

const chips: readonly TableChip<ListedRow>[] = [
  { id: 'open', label: 'Being written', matches: (row) => row.isOpen },
  { id: 'sent', label: 'Sent', matches: (row) => !['draft', 'withdrawn', 'lapsed'].includes(row.state) },
  { id: 'away', label: 'Put away', matches: (row) => row.isPutAway },
]

/** Every proposal that names the reader. */
export function ProposalTable({ initial }: { initial: ProposalsReply }) {
  const { data, error } = useTableQuery({
    key: ['proposals'],
    url: paths.api.table('proposals'),
    schema: proposalsReply,
    initialData: initial,
  })
  // The page just rendered may know more than what the browser kept from an earlier visit.
  const reply = data && data.now > initial.now ? data : initial
  const rows = useMemo(() => reply.rows.map((row) => ({ ...row, now: reply.now })), [reply])
  return (
    <>
      {error ? (
        <p role="alert" className="mb-4 text-table font-semibold text-not-feasible">
          {error.message}
        </p>
      ) : null}
      <DataTable
        caption="My proposals"
        columns={proposalColumns}
        rows={rows}
        rowId={(row) => row.reference}
        find="Title, reference or name"
        chips={chips}
        csv="proposals"
        tone={(row) => (row.hasAgreed ? null : 'attention')}
      />
    </>
  )
}
