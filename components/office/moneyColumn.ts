import type { TableColumn } from '@/components/tables/tableColumn'
import type { OfficeProposalRow } from '@/lib/domain/calls/officeProposalSchema'
import { ABSENT, formatAmount } from '@/lib/format'

/** A column of amounts in minor units, all of one currency, with its sum. */
export const money = (
  id: string,
  head: string,
  amount: (row: OfficeProposalRow) => number,
  currency: string,
): TableColumn<OfficeProposalRow> => ({
  id,
  head,
  unit: currency,
  align: 'right',
  value: amount,
  cell: (row) => (amount(row) === 0 ? ABSENT : formatAmount(amount(row), row.currency)),
  csv: (row) => amount(row) / 100,
  total: (rows) =>
    formatAmount(
      rows.reduce((sum, row) => sum + amount(row), 0),
      currency,
    ),
})
