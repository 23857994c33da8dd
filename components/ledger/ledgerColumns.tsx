import { affiliationWords } from '@/components/fees/affiliationWords'
import { stateWords } from '@/components/office/stateWords'
import type { TableColumn } from '@/components/tables/tableColumn'
import { TextLink } from '@/components/ui/TextLink'
import type { LedgerGrouping, LedgerTotal } from './ledgerSums'
import { accountWords, movementWords } from '@/lib/domain/fees/movementWords'
import { ABSENT, formatAmount, formatUtcInstant } from '@/lib/format'
import { minorDigits } from '@/lib/format/minorDigits'
import { paths } from '@/lib/paths'
import type { LedgerMovement } from './LedgerMovement'

const groupHeads: Record<LedgerGrouping, string> = { call: 'Call', state: 'Fee is', class: 'Led from' }

const groupWords = (by: LedgerGrouping, key: string): string =>
  by === 'class'
    ? affiliationWords[key as keyof typeof affiliationWords]
    : by === 'state'
      ? stateWords(key)
      : key

function amount(
  id: string,
  head: string,
  of: (total: LedgerTotal) => number,
  currency: string,
): TableColumn<LedgerTotal> {
  return {
    id,
    head,
    unit: currency,
    align: 'right',
    value: of,
    cell: (row) => (of(row) === 0 ? ABSENT : formatAmount(of(row), currency)),
    csv: (row) => of(row) / 10 ** minorDigits(currency),
    total: (rows) =>
      formatAmount(
        rows.reduce((sum, row) => sum + of(row), 0),
        currency,
      ),
  }
}

/** Columns of the totals, grouped one of three ways. */
export const totalColumns = (by: LedgerGrouping, currency: string): TableColumn<LedgerTotal>[] => [
  {
    id: 'group',
    head: groupHeads[by],
    value: (row) => groupWords(by, row.key),
    total: () => 'In all',
  },
  {
    id: 'fees',
    head: 'Fees',
    align: 'right',
    value: (row) => row.fees,
    total: (rows) => String(rows.reduce((sum, row) => sum + row.fees, 0)),
  },
  amount('billed', 'Billed', (row) => row.billedMinor, currency),
  amount('waived', 'Waived', (row) => row.waivedMinor, currency),
  amount('dropped', 'Dropped', (row) => row.droppedMinor, currency),
  amount('owed', 'Owed', (row) => row.owedMinor, currency),
  amount('paid', 'Paid in', (row) => row.paidMinor, currency),
  amount('back', 'Given back', (row) => row.givenBackMinor, currency),
  amount('disputed', 'In disputes', (row) => row.disputedMinor, currency),
  amount('kept', 'Kept', (row) => row.keptMinor, currency),
]

/** Columns of the movements; keep at module scope. */
export const movementColumns: TableColumn<LedgerMovement>[] = [
  {
    id: 'at',
    head: 'When',
    unit: 'UTC',
    value: (row) => row.at,
    cell: (row) => formatUtcInstant(new Date(row.at)).replace(' UTC', ''),
  },
  {
    id: 'reference',
    head: 'Reference',
    value: (row) => row.reference,
    cell: (row) => (
      <TextLink href={paths.officeFee(row.reference)} strong>
        {row.reference}
      </TextLink>
    ),
  },
  { id: 'call', head: 'Call', align: 'right', value: (row) => row.callNumber },
  { id: 'class', head: 'Led from', value: (row) => affiliationWords[row.affiliationClass] },
  { id: 'what', head: 'What', value: (row) => movementWords(row.movement) },
  { id: 'from', head: 'From', value: (row) => accountWords[row.from] },
  { id: 'to', head: 'To', value: (row) => accountWords[row.to] },
  {
    id: 'amount',
    head: 'Amount',
    align: 'right',
    value: (row) => row.amountMinor,
    cell: (row) => `${row.currency} ${formatAmount(row.amountMinor, row.currency)}`,
    csv: (row) => row.amountMinor / 10 ** minorDigits(row.currency),
  },
  { id: 'movement', head: 'Movement', value: (row) => row.movement },
]
