'use client'

import { useInfiniteQuery } from '@tanstack/react-query'
import { DataTable } from '@/components/tables/DataTable'
import { fetchJson } from '@/components/tables/fetchJson'
import type { TableColumn } from '@/components/tables/tableColumn'
import { Button } from '@/components/ui/Button'
import { logbookReply, type LogbookReply, type LogbookTableRow } from '@/lib/domain/logbook/schema'
import { EmptyState } from '@/components/ui/EmptyState'
import { TextLink } from '@/components/ui/TextLink'
import { formatNumber, formatUtcInstant } from '@/lib/format'
import { paths } from '@/lib/paths'
import { LoggedValue } from './LoggedValue'

const columns: TableColumn<LogbookTableRow>[] = [
  {
    id: 'at',
    head: 'When',
    value: (row) => row.at,
    cell: (row) => <span className="sm:whitespace-nowrap">{formatUtcInstant(new Date(row.at))}</span>,
  },
  {
    id: 'person',
    head: 'Who',
    value: (row) => row.person ?? row.actingAs,
    cell: (row) => <span className="sm:whitespace-nowrap">{row.person ?? row.actingAs}</span>,
  },
  { id: 'as', head: 'Acting as', value: (row) => row.actingAs },
  { id: 'action', head: 'What', value: (row) => row.action },
  { id: 'subject', head: 'Of what', value: (row) => row.subject },
  {
    id: 'before',
    head: 'Before',
    wide: true,
    value: (row) => row.before,
    cell: (row) => <LoggedValue json={row.before} quiet />,
  },
  {
    id: 'after',
    head: 'After',
    wide: true,
    value: (row) => row.after,
    cell: (row) => <LoggedValue json={row.after} />,
  },
  { id: 'address', head: 'From', value: (row) => row.address },
]

interface LogbookTableProps {
  initial: LogbookReply
  /** The filter as it stands in the address, `who=maud&action=invite`. */
  filter: string
}

/** The logbook, five hundred rows at a time. */
export function LogbookTable({ initial, filter }: LogbookTableProps) {
  const query = useInfiniteQuery({
    queryKey: ['office-logbook', filter],
    initialPageParam: '',
    queryFn: ({ pageParam, signal }) => {
      const asked = new URLSearchParams(filter)
      if (pageParam) asked.set('before', pageParam)
      return fetchJson(`${paths.api.table('office-logbook')}?${asked}`, logbookReply, signal)
    },
    getNextPageParam: (last) => (last.hasMore ? String(last.rows.at(-1)?.id ?? '') : undefined),
    initialData: { pages: [initial], pageParams: [''] },
  })
  const rows = query.data.pages.flatMap((page) => page.rows)
  return (
    <>
      <DataTable
        caption="Logbook"
        columns={columns}
        rows={rows}
        rowId={(row) => String(row.id)}
        page={50}
        empty={
          <EmptyState title="No row like this">
            Nothing in the logbook fits. Take something out of what you ask for.
          </EmptyState>
        }
        actions={
          <TextLink href={`${paths.api.table('office-logbook')}/file?${filter}`} download>
            All these rows as CSV
          </TextLink>
        }
        phone="cards"
      />
      {query.hasNextPage ? (
        <div className="mt-4 flex flex-wrap items-center gap-4 text-table">
          <Button
            look="secondary"
            busy={query.isFetchingNextPage}
            busyWord="Reading"
            onClick={() => void query.fetchNextPage()}
          >
            Read further back
          </Button>
          <span className="text-muted">{`The newest ${formatNumber(rows.length)} rows are read so far.`}</span>
        </div>
      ) : null}
    </>
  )
}
