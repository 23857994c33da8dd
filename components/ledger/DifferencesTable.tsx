'use client'

import { DataTable } from '@/components/tables/DataTable'
import type { TableColumn } from '@/components/tables/tableColumn'
import { EmptyState } from '@/components/ui/EmptyState'
import { TextLink } from '@/components/ui/TextLink'
import { ABSENT, formatUtcInstant } from '@/lib/format'
import { paths } from '@/lib/paths'
import { forPeople } from './forPeople'

export interface DifferenceRow {
  id: string
  /** ISO; null for what differs now. */
  at: string | null
  reference: string | null
  payment: string
  ours: string
  theirs: string
  /** What was done, or who has to do something. */
  outcome: string
}

const columns = (hasTime: boolean): TableColumn<DifferenceRow>[] => [
  ...(hasTime
    ? [
        {
          id: 'at',
          head: 'When',
          unit: 'UTC',
          value: (row: DifferenceRow) => row.at,
          cell: (row: DifferenceRow) =>
            row.at === null ? ABSENT : formatUtcInstant(new Date(row.at)).replace(' UTC', ''),
        },
      ]
    : []),
  {
    id: 'reference',
    head: 'Reference',
    value: (row) => row.reference,
    cell: (row) =>
      row.reference ? (
        <TextLink href={paths.officeFee(row.reference)} strong>
          {row.reference}
        </TextLink>
      ) : (
        ABSENT
      ),
  },
  { id: 'payment', head: 'Payment at the firm', value: (row) => row.payment, wide: true },
  { id: 'ours', head: 'Our books', value: (row) => row.ours },
  { id: 'theirs', head: 'The firm’s list', value: (row) => row.theirs },
  {
    id: 'outcome',
    head: hasTime ? 'What was done' : 'What will be done',
    value: (row) => row.outcome,
    wide: true,
  },
]

const nowColumns = columns(false)
const pastColumns = columns(true)

interface DifferencesTableProps {
  caption: string
  rows: readonly DifferenceRow[]
  kind: 'now' | 'past'
  empty: { title: string; words: string }
}

/** Where our books and the firm's list do not say the same, now or before. */
export function DifferencesTable({ caption, rows, kind, empty }: DifferencesTableProps) {
  return (
    <DataTable
      caption={caption}
      columns={kind === 'now' ? nowColumns : pastColumns}
      rows={rows}
      rowId={(row) => row.id}
      csv={kind === 'now' ? 'differences' : 'differences-found'}
      urlPrefix={kind === 'now' ? 'n-' : 'p-'}
      tone={(row) => (row.outcome === forPeople ? 'attention' : null)}
      empty={<EmptyState title={empty.title}>{empty.words}</EmptyState>}
    />
  )
}
