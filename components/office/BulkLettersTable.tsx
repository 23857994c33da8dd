'use client'

import { DataTable } from '@/components/tables/DataTable'
import type { TableColumn } from '@/components/tables/tableColumn'
import { EmptyState } from '@/components/ui/EmptyState'
import { LinkButton } from '@/components/ui/LinkButton'
import { TextLink } from '@/components/ui/TextLink'
import { ABSENT, formatUtcWithYear } from '@/lib/format'
import { paths } from '@/lib/paths'

interface BulkLine {
  id: number
  subject: string
  writtenBy: string | null
  createdAt: string
  queuedAt: string | null
  isStopped: boolean
  recipients: number | null
  sent: number
}

const when = (at: string | null) => (at ? formatUtcWithYear(new Date(at)) : ABSENT)

function stands(row: BulkLine): string {
  if (!row.queuedAt) return 'draft'
  if (row.isStopped) return 'stopped'
  return row.sent === row.recipients ? 'sent' : 'going out'
}

const columns: TableColumn<BulkLine>[] = [
  {
    id: 'subject',
    head: 'Subject',
    value: (row) => row.subject,
    cell: (row) => <TextLink href={paths.bulkLetter(row.id)}>{row.subject}</TextLink>,
  },
  { id: 'by', head: 'Written by', value: (row) => row.writtenBy },
  { id: 'written', head: 'Written', value: (row) => row.createdAt, cell: (row) => when(row.createdAt) },
  {
    id: 'given',
    head: 'Given to the outbox',
    value: (row) => row.queuedAt,
    cell: (row) => when(row.queuedAt),
  },
  { id: 'people', head: 'People', align: 'right', value: (row) => row.recipients },
  { id: 'sent', head: 'Sent', align: 'right', value: (row) => (row.queuedAt ? row.sent : null) },
  { id: 'stands', head: 'Stands', value: stands },
]

/** Letters to many with how far each has got. */
export function BulkLettersTable({ letters }: { letters: readonly BulkLine[] }) {
  return (
    <DataTable
      caption="Letters to many"
      columns={columns}
      rows={letters}
      rowId={(row) => String(row.id)}
      page={50}
      empty={
        <EmptyState
          title="No letter to many yet"
          actions={<LinkButton href={paths.newBulkLetter()}>Write to many</LinkButton>}
        >
          Choose people by call, part and the state of their proposals, and write to all of them at once.
        </EmptyState>
      }
    />
  )
}
