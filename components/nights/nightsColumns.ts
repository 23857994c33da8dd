import type { TableChip, TableColumn } from '@/components/tables/tableColumn'
import type { NightsLine, NightsRow } from '@/lib/domain/decisions/nightsView'
import type { AwardOutlook } from '@/lib/panel/nights/seasonTypes'

/** A row with what becomes of each of its lines; null where it was not run. */
export interface ShownRow extends NightsRow {
  outlooks: (AwardOutlook | null)[]
}

/** The least of the chances of its lines: an award is finished when all of them are. */
const chance = (row: ShownRow): number | null => {
  const chances = row.outlooks.flatMap((outlook) => (outlook ? [outlook.chance] : []))
  return chances.length > 0 ? Math.min(...chances) : null
}

const hours = (row: NightsRow, of: (line: NightsLine) => number) =>
  row.lines.reduce((sum, line) => sum + of(line), 0) / 3600
const given = (line: NightsLine) => line.givenSeconds

/** What the facing hours are ordered and searched by. */
export const nightsColumns: TableColumn<ShownRow>[] = [
  { id: 'suggested', head: 'Suggested', value: (row) => hours(row, (line) => line.suggestedSeconds) },
  { id: 'rank', head: 'Rank', value: (row) => row.rank },
  { id: 'given', head: 'Given', value: (row) => hours(row, given) },
  { id: 'chance', head: 'Observed in full', value: chance },
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

export const nightsChips: TableChip<ShownRow>[] = [
  { id: 'given', label: 'Given', matches: (row) => hours(row, given) > 0 },
  { id: 'part', label: 'In part', matches: (row) => row.lines.some(isPart) },
  { id: 'laid', label: 'Laid down', matches: (row) => row.choice !== null || row.tried !== null },
  { id: 'none', label: 'Given none', matches: (row) => hours(row, given) === 0 },
]
