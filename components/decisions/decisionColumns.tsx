import type { Seasons } from '@/components/nights/useSeasons'
import { reviewNumberColumn } from '@/components/panel/reviewNumberColumn'
import type { TableColumn } from '@/components/tables/tableColumn'
import type { DecisionRow } from '@/lib/domain/decisions/decisionsView'
import { formatNumber } from '@/lib/format'
import { chanceColumn } from './chanceColumn'
import { flagsOf } from './flagsOf'
import { OutcomeMark } from './OutcomeMark'
import { decisionButtonId, needsOpening } from './unopened'

const given = (row: DecisionRow) => row.lines.reduce((sum, line) => sum + line.seconds, 0) / 3600

/** Columns of a panel's decisions; the chance of each only where seasons are drawn. */
export function decisionColumns(
  open: number | null,
  onOpen: (proposalId: number | null) => void,
  outlookOf?: Seasons['outlookOf'],
): TableColumn<DecisionRow>[] {
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
    reviewNumberColumn(open, onOpen, decisionButtonId),
    { id: 'title', head: 'Title', value: (row) => row.title },
    {
      id: 'outcome',
      head: 'Outcome',
      value: (row) => row.outcome,
      cell: (row) => <OutcomeMark outcome={row.outcome} />,
    },
    {
      id: 'given',
      head: 'Given',
      unit: 'h',
      align: 'right',
      value: (row) => (row.lines.length > 0 ? given(row) : null),
      cell: (row) => (row.lines.length > 0 ? formatNumber(given(row), 1) : '–'),
      total: (rows) =>
        formatNumber(
          rows
            .flatMap((row) => row.lines)
            .reduce((sum, line) => sum + (line.isReserve ? 0 : line.seconds / 3600), 0),
          1,
        ),
    },
    {
      id: 'asked',
      head: 'Asked',
      unit: 'h',
      align: 'right',
      value: (row) => row.askedSeconds / 3600,
      cell: (row) => formatNumber(row.askedSeconds / 3600, 1),
      total: (rows) =>
        formatNumber(
          rows.reduce((sum, row) => sum + row.askedSeconds / 3600, 0),
          1,
        ),
    },
    ...(outlookOf ? [chanceColumn(outlookOf)] : []),
    {
      id: 'lines',
      head: 'On',
      sortable: false,
      value: (row) =>
        row.lines
          .map((line) =>
            [line.instrument, line.isReserve ? 'reserve' : '', line.conditions].filter(Boolean).join(', '),
          )
          .join('; '),
    },
    {
      id: 'statement',
      head: 'Statement',
      value: (row) => [...row.statement].length,
      cell: (row) =>
        row.isPrepared ? (
          `${formatNumber([...row.statement].length)} characters`
        ) : (
          <span className="font-semibold text-lamp">not written</span>
        ),
      csv: (row) => row.statement,
    },
    {
      id: 'flags',
      head: 'Look at',
      unit: 'places',
      align: 'right',
      value: (row) => flagsOf(row),
      cell: (row) => (flagsOf(row) > 0 ? flagsOf(row) : '–'),
    },
    {
      id: 'approval',
      head: 'Second person',
      value: (row) => (row.approval === 'approved' ? row.approvedBy : row.approval),
      cell: (row) =>
        row.approval === 'approved' ? (
          row.approvedBy
        ) : (
          <span className="font-semibold text-lamp">
            {row.approval === 'changed' ? 'changed since' : 'not yet'}
            {needsOpening(row) ? ', not opened' : ''}
          </span>
        ),
    },
  ]
}
