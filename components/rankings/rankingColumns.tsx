import { ChanceBar } from '@/components/charts/ChanceBar'
import { RankInterval } from '@/components/charts/RankInterval'
import { reviewNumberColumn } from '@/components/panel/reviewNumberColumn'
import type { TableColumn } from '@/components/tables/tableColumn'
import { isGrey } from '@/lib/domain/rankings/rules'
import type { RankingRow } from '@/lib/domain/rankings/rankingView'
import { ABSENT, formatNumber, formatSigned } from '@/lib/format'

export interface RankingColumnsInput {
  callSlug: string
  count: number
  line: number
  zone: { first: number; last: number } | null
  selected: number | null
  onSelect: (proposalId: number | null) => void
  /** The panel has a measure of its own. */
  hasMeasure: boolean
}

/** The interval, or a dash where nothing could be drawn. */
function Interval({
  row,
  count,
  line,
  zone,
}: { row: RankingRow } & Pick<RankingColumnsInput, 'count' | 'line' | 'zone'>) {
  const { meritRank, rawRank, low, high, lowerHalf, upperHalf } = row
  if (meritRank === null || rawRank === null || low === null || high === null) return <>{ABSENT}</>
  return (
    <RankInterval
      count={count}
      line={line}
      zone={zone ? [zone.first, zone.last] : undefined}
      grey={isGrey(row.chance)}
      merit={meritRank}
      raw={rawRank}
      low={low}
      high={high}
      lowerHalf={lowerHalf ?? low}
      upperHalf={upperHalf ?? high}
    />
  )
}

const measureColumn: TableColumn<RankingRow> = {
  id: 'measure',
  head: 'Own',
  unit: 'and rank',
  align: 'right',
  value: (row) => row.measure,
  cell: (row) => (
    <span className="whitespace-nowrap">
      {formatNumber(row.measure, 2)}{' '}
      <span className="text-tick text-muted">{row.measureRank === null ? '' : row.measureRank}</span>
    </span>
  ),
}

export function rankingColumns(input: RankingColumnsInput): TableColumn<RankingRow>[] {
  const { count, line, zone, selected, onSelect } = input
  return [
    {
      id: 'rank',
      head: 'Rank',
      align: 'right',
      value: (row) => row.rank,
      cell: (row) => (
        <>
          <span className="sm:hidden">Rank </span>
          {row.rank}
        </>
      ),
    },
    reviewNumberColumn(selected, onSelect),
    {
      id: 'title',
      head: 'Title',
      value: (row) => row.title,
      cell: (row) => (
        <>
          {row.title}
          {row.setAside ? <span className="text-muted"> · set aside</span> : null}
        </>
      ),
    },
    {
      id: 'asked',
      head: 'Asked',
      unit: 'h',
      value: (row) => row.askedSeconds / 3600,
      cell: (row) => (
        <span className="whitespace-nowrap">
          {row.lines.map((one) => (
            <span key={one.instrumentId} className="block">
              {one.instrument} <span className="text-muted">{formatNumber(one.seconds / 3600, 1)}</span>
            </span>
          ))}
        </span>
      ),
    },
    {
      id: 'raw',
      head: 'Raw',
      unit: 'mean',
      align: 'right',
      value: (row) => row.raw,
      cell: (row) => <span className="font-semibold">{formatNumber(row.raw, 2)}</span>,
    },
    {
      id: 'merit',
      head: 'Merit',
      unit: 'and shift',
      align: 'right',
      value: (row) => row.merit,
      cell: (row) => (
        <span className="whitespace-nowrap">
          {formatNumber(row.merit, 2)}{' '}
          <span className="text-tick text-muted">{formatSigned(row.shift, 2)}</span>
        </span>
      ),
    },
    ...(input.hasMeasure ? [measureColumn] : []),
    {
      id: 'chance',
      head: 'P above the line',
      unit: 'half is the tick',
      value: (row) => row.chance,
      cell: (row) =>
        row.chance === null ? ABSENT : <ChanceBar chance={row.chance} grey={isGrey(row.chance)} />,
    },
    {
      id: 'interval',
      head: 'Where the rank could lie',
      unit: `1 to ${count}`,
      sortable: false,
      wide: true,
      value: (row) => (row.low === null ? null : `${row.low} to ${row.high ?? row.low}`),
      cell: (row) => (
        <span className="inline-block align-middle sm:-my-2">
          <Interval row={row} count={count} line={line} zone={zone} />
        </span>
      ),
    },
  ]
}
