import type { TableColumn } from '@/components/tables/tableColumn'
import type { OfficeProposalRow } from '@/lib/domain/calls/officeProposalSchema'
import { money } from './moneyColumn'
import { stateWords } from './stateWords'

const owed = (row: OfficeProposalRow) =>
  row.feeState === 'due' || row.feeState === 'invoiced' ? (row.feeMinor ?? 0) : 0

/** Columns of the office's fees, in the call's currency. */
export const feeColumns = (currency: string): TableColumn<OfficeProposalRow>[] => [
  { id: 'reference', head: 'Reference', value: (row) => row.reference, total: () => 'In all' },
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
    value: (row) => (row.waiverId === null ? stateWords(row.feeState ?? '') : 'waiver asked'),
    cell: (row) => (
      <span className={row.feeState === 'due' ? 'font-semibold text-lamp' : undefined}>
        {row.waiverId === null ? stateWords(row.feeState ?? '') : 'waiver asked'}
      </span>
    ),
  },
]
