'use client'

import { useInfiniteQuery } from '@tanstack/react-query'
import { DataTable } from '@/components/tables/DataTable'
import { fetchJson } from '@/components/tables/fetchJson'
import type { TableColumn } from '@/components/tables/tableColumn'
import { Button } from '@/components/ui/Button'
import { logbookReply, type LogbookReply, type LogbookTableRow } from '@/lib/domain/logbook/schema'
import { ABSENT, formatUtcInstant } from '@/lib/format'
import { paths } from '@/lib/paths'

const short = (json: string) => (json.length > 160 ? `${json.slice(0, 160)}…` : json)

const columns: TableColumn<LogbookTableRow>[] = [
  { id: 'at', head: 'When', value: (row) => row.at, cell: (row) => formatUtcInstant(new Date(row.at)) },
  { id: 'person', head: 'Who', value: (row) => row.person ?? row.actingAs },
  { id: 'as', head: 'Acting as', value: (row) => row.actingAs },
  { id: 'action', head: 'What', value: (row) => row.action },
  { id: 'subject', head: 'Of what', value: (row) => row.subject },
  {
    id: 'before',
    head: 'Before',
    wide: true,
    value: (row) => row.before,
    cell: (row) => <span className="[overflow-wrap:anywhere] text-muted">{short(row.before) || ABSENT}</span>,
  },
  {
    id: 'after',
    head: 'After',
    wide: true,
    value: (row) => row.after,
    cell: (row) => <span className="[overflow-wrap:anywhere]">{short(row.after) || ABSENT}</span>,
  },
  { id: 'address', head: 'From', value: (row) => row.address },
]

/** The logbook, five hundred rows at a time. */
export function LogbookTable({ initial }: { initial: LogbookReply }) {
  const query = useInfiniteQuery({
    queryKey: ['office-logbook'],
    initialPageParam: '',
    queryFn: ({ pageParam, signal }) =>
      fetchJson(
        `${paths.api.table('office-logbook')}${pageParam ? `?before=${pageParam}` : ''}`,
        logbookReply,
        signal,
      ),
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
        find="Who, what or of what"
        csv="logbook"
        page={50}
        phone="cards"
      />
      {query.hasNextPage ? (
        <div className="mt-4">
          <Button
            look="secondary"
            busy={query.isFetchingNextPage}
            busyWord="Reading"
            onClick={() => void query.fetchNextPage()}
          >
            Read further back
          </Button>
        </div>
      ) : null}
    </>
  )
}
