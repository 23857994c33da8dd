import type { TableChip, TableColumn } from '@/components/tables/tableColumn'
import type { NightsLine, NightsRow } from '@/lib/domain/decisions/nightsView'

const hours = (row: NightsRow, of: (line: NightsLine) => number) =>
  row.lines.reduce((sum, line) => sum + of(line), 0) / 3600
const given = (line: NightsLine) => line.givenSeconds

/** What the facing hours are ordered and searched by. */
export const nightsColumns: TableColumn<NightsRow>[] = [
  { id: 'suggested', head: 'Suggested', value: (row) => hours(row, (line) => line.suggestedSeconds) },
  { id: 'rank', head: 'Rank', value: (row) => row.rank },
  { id: 'given', head: 'Given', value: (row) => hours(row, given) },
  { id: 'number', head: 'Review number', value: (row) => row.reviewNumber },
  { id: 'title', head: 'Title', sortable: false, value: (row) => row.title },
  {
    id: 'instruments',
    head: 'Instruments',
    sortable: false,
    value: (row) => row.lines.map((line) => line.instrument).join(', '),
  },
]

const isPart = (line: NightsLine) => line.givenSeconds > 0 && line.givenSeconds < line.wholeSeconds

export const nightsChips: TableChip<NightsRow>[] = [
  { id: 'given', label: 'Given', matches: (row) => hours(row, given) > 0 },
  { id: 'part', label: 'In part', matches: (row) => row.lines.some(isPart) },
  { id: 'none', label: 'Given none', matches: (row) => hours(row, given) === 0 },
]
