'use client'

import { phaseWords } from '@/components/calls/phaseWords'
import { seasonWords } from '@/components/calls/seasonWords'
import { DataTable } from '@/components/tables/DataTable'
import type { TableColumn } from '@/components/tables/tableColumn'
import { TextLink } from '@/components/ui/TextLink'
import type { Call, CallPhase } from '@/lib/domain/calls/types'
import { formatUtcWithYear } from '@/lib/format'
import { paths } from '@/lib/paths'

type Row = Call & { phase: CallPhase }

const columns: TableColumn<Row>[] = [
  {
    id: 'number',
    head: 'Call',
    value: (row) => row.number,
    cell: (row) => (
      <TextLink href={paths.officeCall(row.slug)} strong>
        {row.title}
      </TextLink>
    ),
  },
  {
    id: 'season',
    head: 'Season',
    value: (row) => row.seasonFrom,
    cell: (row) => seasonWords(row.seasonFrom, row.seasonTo),
  },
  { id: 'phase', head: 'Stands', value: (row) => phaseWords[row.phase] },
  {
    id: 'closes',
    head: 'Deadline',
    value: (row) => row.closesAt,
    cell: (row) => formatUtcWithYear(row.closesAt),
  },
  {
    id: 'letters',
    head: 'Letters',
    value: (row) => row.lettersAt,
    cell: (row) => formatUtcWithYear(row.lettersAt),
  },
]

/** All calls with where they stand. */
export function CallsOfOffice({ calls }: { calls: Row[] }) {
  return <DataTable caption="Calls" columns={columns} rows={calls} rowId={(row) => row.slug} csv="calls" />
}
