import type { TableColumn } from '@/components/tables/tableColumn'
import type { OfficeProposalRow } from '@/lib/domain/calls/officeProposalSchema'
import { money } from './moneyColumn'
import { FeeLink } from './FeeLink'
import { feeState, wantsOffice } from './feeState'

const owed = (row: OfficeProposalRow) =>
  row.feeState === 'due' || row.feeState === 'invoiced' ? (row.feeMinor ?? 0) : 0

/** Columns of the office's fees, in the call's currency. */
export const feeColumns = (currency: string): TableColumn<OfficeProposalRow>[] => [
  {
    id: 'reference',
    head: 'Reference',
    value: (row) => row.reference,
    cell: (row) => <FeeLink reference={row.reference} />,
    total: () => 'In all',
  },
  { id: 'lead', head: 'Led by', value: (row) => row.lead },
  { id: 'kind', head: 'Kind', value: (row) => row.kind },
  money('billed', 'Billed', (row) => row.feeMinor ?? 0, currency),
  money('paid', 'Paid', (row) => row.paidMinor, currency),
  money('waived', 'Waived', (row) => (row.feeState === 'waived' ? (row.feeMinor ?? 0) : 0), currency),
  money('refunded', 'Refunded', (row) => row.refundedMinor, currency),
  money('owed', 'Owed', owed, currency),
  {
    id: 'state',
    head: 'State',
    value: feeState,
    cell: (row) => (
      <span className={row.feeState === 'due' || wantsOffice(row) ? 'font-semibold text-lamp' : undefined}>
        {feeState(row)}
      </span>
    ),
  },
]
