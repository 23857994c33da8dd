'use client'

import { seasonWords } from '@/components/calls/seasonWords'
import { DataTable } from '@/components/tables/DataTable'
import type { TableColumn } from '@/components/tables/tableColumn'
import type { CallComparison } from '@/lib/domain/figures/types'
import { ABSENT, formatNumber } from '@/lib/format'
import { timesOver } from './timesOver'

const hours = (seconds: number) => formatNumber(seconds / 3600, 1)

const columns: TableColumn<CallComparison>[] = [
  { id: 'call', head: 'Call', value: (row) => row.callNumber, cell: (row) => `Call ${row.callNumber}` },
  {
    id: 'season',
    head: 'Season',
    value: (row) => row.season.from,
    cell: (row) => seasonWords(row.season.from, row.season.to),
  },
  { id: 'proposals', head: 'Proposals sent', align: 'right', value: (row) => row.proposals },
  {
    id: 'asked',
    head: 'Asked',
    unit: 'h',
    align: 'right',
    value: (row) => row.askedSeconds,
    cell: (row) => hours(row.askedSeconds),
    csv: (row) => row.askedSeconds / 3600,
  },
  {
    id: 'offered',
    head: 'On offer',
    unit: 'h',
    align: 'right',
    value: (row) => row.offeredSeconds,
    cell: (row) => hours(row.offeredSeconds),
    csv: (row) => row.offeredSeconds / 3600,
  },
  {
    id: 'times',
    head: 'Times over',
    align: 'right',
    value: timesOver,
    cell: (row) => {
      const times = timesOver(row)
      return times === null ? ABSENT : formatNumber(times, 2)
    },
  },
]

/** This call against those before it. */
export function CallsCompared({ calls, fileName }: { calls: CallComparison[]; fileName: string }) {
  return (
    <DataTable
      caption="This call and those before it"
      columns={columns}
      rows={calls}
      rowId={(row) => row.slug}
      csv={fileName}
      phone="scroll"
    />
  )
}
