'use client'

import { DataTable } from '@/components/tables/DataTable'
import type { TableColumn } from '@/components/tables/tableColumn'
import type { HalfMonth } from '@/lib/domain/calendar/types'
import { formatCalendarDate, formatNumber } from '@/lib/format'

type Seconds = Exclude<keyof HalfMonth, 'from' | 'to' | 'nights'>
const hours = (seconds: number) => formatNumber(seconds / 3600, 1)

const column = (id: Seconds, head: string): TableColumn<HalfMonth> => ({
  id,
  head,
  unit: 'h',
  align: 'right',
  value: (row) => row[id],
  cell: (row) => hours(row[id]),
  csv: (row) => Number((row[id] / 3600).toFixed(3)),
  total: (rows) => hours(rows.reduce((sum, row) => sum + row[id], 0)),
})

const columns: TableColumn<HalfMonth>[] = [
  {
    id: 'half',
    head: 'Half-month',
    value: (row) => row.from,
    cell: (row) => `${formatCalendarDate(row.from, false)} to ${formatCalendarDate(row.to)}`,
    total: () => 'The season',
  },
  {
    id: 'nights',
    head: 'Nights',
    align: 'right',
    value: (row) => row.nights,
    total: (rows) => String(rows.reduce((sum, row) => sum + row.nights, 0)),
  },
  column('darkSeconds', 'Dark'),
  column('scienceSeconds', 'Science'),
  column('boundSeconds', 'To one instrument'),
  column('engineeringSeconds', 'Engineering'),
  column('promisedSeconds', 'Promised'),
  column('freeSeconds', 'For nothing'),
]

/** Hours of a telescope by half-month and by what they are for. */
export function HalfMonthTable({
  name,
  halves,
  fileName,
}: {
  name: string
  halves: HalfMonth[]
  fileName: string
}) {
  return (
    <DataTable
      caption={`Hours of ${name} by half-month`}
      columns={columns}
      rows={halves}
      rowId={(row) => row.from}
      csv={fileName}
      urlPrefix={`${name.toLowerCase()}-`}
      phone="scroll"
    />
  )
}
