'use client'

import { DataTable } from '@/components/tables/DataTable'
import { useTableQuery } from '@/components/tables/useTableQuery'
import { EmptyState } from '@/components/ui/EmptyState'
import { ShareBar } from '@/components/ui/ShareBar'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { officeProposalsReply, type OfficeProposalsReply } from '@/lib/domain/calls/officeProposalSchema'
import type { DecideWaiverInput } from '@/lib/domain/fees/schema'
import { formatAmount } from '@/lib/format'
import { paths } from '@/lib/paths'
import { feeColumns } from './feeColumns'
import { wantsOffice } from './feeState'
import { feeSums } from './feeSums'
import { WaiverForm } from './WaiverForm'

interface FeesOfCallProps {
  slug: string
  initial: OfficeProposalsReply
  /** The fee that is open beside the table. */
  selected: string | null
  decide: FormAction<DecideWaiverInput, unknown>
}

/** Fees of a call: the sum in a bar, the table, and a decision under each waiver that is asked for. */
export function FeesOfCall({ slug, initial, selected, decide }: FeesOfCallProps) {
  const { data = initial } = useTableQuery({
    key: ['office-proposals', slug],
    url: `${paths.api.table('office-proposals')}?call=${encodeURIComponent(slug)}`,
    schema: officeProposalsReply,
    initialData: initial,
  })
  const rows = data.rows.filter((row) => row.feeMinor !== null)
  const sums = feeSums(rows)
  const currency = rows[0]?.currency ?? 'EUR'
  return (
    <>
      {rows.length > 0 ? (
        <ShareBar
          label="Fees by what became of them"
          parts={[
            {
              label: 'paid and kept',
              amount: sums.kept,
              value: formatAmount(sums.kept, currency),
              colour: 'feasible',
            },
            {
              label: 'waived',
              amount: sums.waived,
              value: formatAmount(sums.waived, currency),
              colour: 'accent',
            },
            {
              label: 'in disputes',
              amount: sums.disputed,
              value: formatAmount(sums.disputed, currency),
              colour: 'edge',
            },
            { label: 'owed', amount: sums.owed, value: formatAmount(sums.owed, currency), colour: 'lamp' },
          ]}
        />
      ) : null}
      <div className="mt-6">
        <DataTable
          caption="Fees"
          columns={feeColumns(currency)}
          rows={rows}
          rowId={(row) => row.reference}
          selectedId={selected}
          find="Reference or name"
          chips={[
            { id: 'owed', label: 'Owed', matches: (row) => row.feeState === 'due' },
            { id: 'waiver', label: 'Waiver asked', matches: (row) => row.waiverId !== null },
            { id: 'invoice', label: 'By invoice', matches: (row) => row.invoice !== null },
            { id: 'disputed', label: 'Disputed', matches: (row) => row.disputedMinor + row.lostMinor > 0 },
            { id: 'refunded', label: 'Refunded', matches: (row) => row.refundedMinor > 0 },
          ]}
          csv={`fees-${slug}`}
          tone={(row) => (wantsOffice(row) ? 'attention' : null)}
          detail={(row) =>
            row.waiverId === null ? null : (
              <WaiverForm
                waiverId={row.waiverId}
                reason={row.waiverReason ?? ''}
                slug={slug}
                action={decide}
              />
            )
          }
          empty={<EmptyState title="Nothing billed yet">A fee is billed when a proposal is sent.</EmptyState>}
        />
      </div>
    </>
  )
}
