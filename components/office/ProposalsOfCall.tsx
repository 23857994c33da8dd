'use client'

import { DataTable } from '@/components/tables/DataTable'
import { useTableQuery } from '@/components/tables/useTableQuery'
import { EmptyState } from '@/components/ui/EmptyState'
import { officeProposalsReply, type OfficeProposalsReply } from '@/lib/domain/calls/officeProposalSchema'
import { paths } from '@/lib/paths'
import { proposalColumns } from './proposalColumns'

interface ProposalsOfCallProps {
  slug: string
  initial: OfficeProposalsReply
}

/** Who sent what and when, and who paid. */
export function ProposalsOfCall({ slug, initial }: ProposalsOfCallProps) {
  const { data = initial } = useTableQuery({
    key: ['office-proposals', slug],
    url: `${paths.api.table('office-proposals')}?call=${encodeURIComponent(slug)}`,
    schema: officeProposalsReply,
    initialData: initial,
  })
  const currency = data.rows[0]?.currency ?? 'EUR'
  return (
    <DataTable
      caption="Proposals of this call"
      columns={proposalColumns(slug, currency)}
      rows={data.rows}
      rowId={(row) => row.reference}
      find="Reference, title or name"
      chips={[
        { id: 'sent', label: 'Sent', matches: (row) => row.arrivedAt !== null },
        { id: 'drafts', label: 'Drafts', matches: (row) => row.arrivedAt === null },
        { id: 'owed', label: 'Owed', matches: (row) => row.feeState === 'due' },
        { id: 'paid', label: 'Paid', matches: (row) => row.feeState === 'paid' },
      ]}
      csv={`proposals-${slug}`}
      empty={<EmptyState title="No proposal yet">Drafts appear here as soon as they are begun.</EmptyState>}
    />
  )
}
