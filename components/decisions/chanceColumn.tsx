import { OutlookMark } from '@/components/nights/OutlookMark'
import type { Seasons } from '@/components/nights/useSeasons'
import type { TableColumn } from '@/components/tables/tableColumn'
import type { DecisionRow } from '@/lib/domain/decisions/decisionsView'

/** How often weather lets an award be finished: as often as the least of its lines. */
export function chanceColumn(outlookOf: Seasons['outlookOf']): TableColumn<DecisionRow> {
  const outlook = (row: DecisionRow) =>
    row.lines
      .map(({ instrumentId }) => outlookOf(row.proposalId, instrumentId))
      .reduce((least, one) => (least && (!one || least.chance <= one.chance) ? least : one), null)
  return {
    id: 'chance',
    head: 'Observed in full',
    unit: 'share of seasons',
    value: (row) => outlook(row)?.chance ?? null,
    cell: (row) => <OutlookMark outlook={outlook(row)} />,
  }
}
