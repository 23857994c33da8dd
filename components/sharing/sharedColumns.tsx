import { UsedBar } from '@/components/charts/UsedBar'
import { reviewNumberColumn } from '@/components/panel/reviewNumberColumn'
import type { TableColumn } from '@/components/tables/tableColumn'
import type { SharedRow } from '@/lib/domain/sharing/sharingView'
import { formatNumber } from '@/lib/format'

export function sharedColumns(
  selected: number | null,
  onSelect: (proposalId: number | null) => void,
): TableColumn<SharedRow>[] {
  return [
    {
      id: 'place',
      head: 'Place',
      align: 'right',
      value: (row) => row.place,
      cell: (row) => (
        <>
          <span className="sm:hidden">Place </span>
          {row.place}
        </>
      ),
    },
    reviewNumberColumn(selected, onSelect),
    { id: 'title', head: 'Title', value: (row) => row.title },
    { id: 'panel', head: 'Panel', value: (row) => row.panel },
    { id: 'rank', head: 'Rank', unit: 'in its panel', align: 'right', value: (row) => row.rank },
    {
      id: 'asked',
      head: 'Asked',
      unit: 'h',
      value: (row) => row.lines.reduce((sum, line) => sum + line.seconds, 0) / 3600,
      cell: (row) => (
        <span className="whitespace-nowrap">
          {row.lines.map((line) => (
            <span key={line.instrument} className="block">
              {line.instrument} <span className="text-muted">{formatNumber(line.seconds / 3600, 1)}</span>
            </span>
          ))}
        </span>
      ),
    },
    {
      id: 'used',
      head: 'Share used',
      unit: 'the tick is the panel’s line',
      value: (row) => row.used,
      cell: (row) => <UsedBar used={row.used} isNear={row.isNear} />,
    },
  ]
}
