'use client'

import { DataTable } from '@/components/tables/DataTable'
import type { TableChip } from '@/components/tables/tableColumn'
import { EmptyState } from '@/components/ui/EmptyState'
import type { LedgerMovement } from './LedgerMovement'
import { movementColumns } from './ledgerColumns'

const begins = (...kinds: string[]) => {
  return (row: LedgerMovement) => kinds.includes(row.movement.split(':')[0] ?? '')
}

const chips: TableChip<LedgerMovement>[] = [
  { id: 'billed', label: 'Billed', matches: begins('billed', 'invoiced', 'credited') },
  { id: 'paid', label: 'Paid', matches: begins('paid', 'settled') },
  { id: 'back', label: 'Given back', matches: begins('refund', 'refunded', 'refund-failed') },
  { id: 'dropped', label: 'Waived or dropped', matches: begins('waived', 'lapsed', 'cancelled') },
  {
    id: 'disputes',
    label: 'Disputes',
    matches: begins('disputed', 'dispute-won', 'dispute-lost', 'dispute-charge'),
  },
]

/** Every movement with both its sides. */
export function LedgerMovements({ movements }: { movements: readonly LedgerMovement[] }) {
  return (
    <DataTable
      caption="Movements"
      columns={movementColumns}
      rows={movements}
      rowId={(row) => String(row.id)}
      find="Reference, account or movement"
      chips={chips}
      csv="ledger-of-fees"
      page={25}
      empty={<EmptyState title="Nothing has moved yet">A fee is billed when a proposal is sent.</EmptyState>}
    />
  )
}
