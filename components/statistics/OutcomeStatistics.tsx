'use client'

import { DataTable } from '@/components/tables/DataTable'
import type { TableColumn } from '@/components/tables/tableColumn'
import { SectionHeading } from '@/components/ui/SectionHeading'
import type {
  CallStatistics,
  OutcomeCounts,
  TelescopeHours,
} from '@/lib/domain/statistics/readCallStatistics'
import { ABSENT, formatNumber } from '@/lib/format'

const count = (id: 'awarded' | 'reserve' | 'declined' | 'all', head: string): TableColumn<OutcomeCounts> => ({
  id,
  head,
  align: 'right',
  sortable: false,
  value: (row) => row[id],
  cell: (row) => (row[id] === null ? ABSENT : formatNumber(row[id])),
})

const countColumns: TableColumn<OutcomeCounts>[] = [
  { id: 'kind', head: 'Kind', sortable: false, value: (row) => row.kind },
  count('awarded', 'Awarded'),
  count('reserve', 'Reserve'),
  count('declined', 'Declined'),
  count('all', 'Decided'),
]

const hours = (
  id: 'offeredSeconds' | 'askedSeconds' | 'givenSeconds',
  head: string,
): TableColumn<TelescopeHours> => ({
  id,
  head,
  unit: 'h',
  align: 'right',
  sortable: false,
  value: (row) => (row[id] === null ? null : row[id] / 3600),
  cell: (row) => (row[id] === null ? ABSENT : formatNumber(row[id] / 3600, 1)),
})

const hourColumns: TableColumn<TelescopeHours>[] = [
  { id: 'telescope', head: 'Telescope', sortable: false, value: (row) => row.telescope },
  hours('offeredSeconds', 'On offer'),
  hours('askedSeconds', 'Asked'),
  hours('givenSeconds', 'Given'),
]

/** How a call came out: proposals by kind, hours by telescope; a dash where a number is kept back. */
export function OutcomeStatistics({ statistics, slug }: { statistics: CallStatistics; slug: string }) {
  return (
    <section>
      <SectionHeading title="How it came out" />
      <div className="mt-4 grid gap-x-16 gap-y-8 lg:grid-cols-2">
        <div className="min-w-0">
          <DataTable
            caption="Proposals by kind and outcome"
            columns={countColumns}
            rows={statistics.counts}
            rowId={(row) => row.kind}
            csv={`outcomes-${slug}`}
            urlPrefix="outcomes-"
            phone="scroll"
          />
        </div>
        <div className="min-w-0">
          <DataTable
            caption="Hours by telescope"
            columns={hourColumns}
            rows={statistics.hours}
            rowId={(row) => row.telescope}
            csv={`hours-${slug}`}
            urlPrefix="hours-"
            phone="scroll"
          />
        </div>
      </div>
      {statistics.isPublic ? (
        <p className="mt-3 text-caption text-muted">
          {ABSENT} Kept back: fewer than five proposals, or a number that would give such a one away.
        </p>
      ) : null}
    </section>
  )
}
