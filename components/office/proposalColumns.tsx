import type { TableColumn } from '@/components/tables/tableColumn'
import { TextLink } from '@/components/ui/TextLink'
import type { OfficeProposalRow } from '@/lib/domain/calls/officeProposalSchema'
import { ABSENT, formatHoursFromSeconds, formatUtcInstant } from '@/lib/format'
import { paths } from '@/lib/paths'
import { money } from './moneyColumn'
import { stateWords } from './stateWords'

/** Columns of the office's list of proposals. */
export const proposalColumns = (slug: string, currency: string): TableColumn<OfficeProposalRow>[] => [
  {
    id: 'reference',
    head: 'Reference',
    value: (row) => row.reference,
    cell: (row) => (
      <TextLink href={paths.officeProposal(slug, row.reference)} plain strong>
        {row.reference}
      </TextLink>
    ),
  },
  { id: 'title', head: 'Title', value: (row) => row.title || 'Untitled' },
  { id: 'lead', head: 'Led by', value: (row) => row.lead },
  { id: 'state', head: 'Stands', value: (row) => stateWords(row.state) },
  {
    id: 'arrived',
    head: 'Arrived',
    value: (row) => row.arrivedAt,
    cell: (row) => (row.arrivedAt ? formatUtcInstant(new Date(row.arrivedAt)) : ABSENT),
  },
  {
    id: 'asked',
    head: 'Asked',
    unit: 'h',
    align: 'right',
    value: (row) => row.askedSeconds,
    cell: (row) => formatHoursFromSeconds(row.askedSeconds).replace(/\s*h$/, ''),
    csv: (row) => row.askedSeconds / 3600,
    total: (rows) =>
      formatHoursFromSeconds(rows.reduce((sum, row) => sum + row.askedSeconds, 0)).replace(/\s*h$/, ''),
  },
  money('fee', 'Fee', (row) => row.feeMinor ?? 0, currency),
  money('paid', 'Paid', (row) => row.paidMinor - row.refundedMinor, currency),
  { id: 'fee-state', head: 'Fee is', value: (row) => (row.feeState ? stateWords(row.feeState) : '') },
]
