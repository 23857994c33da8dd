'use client'

import { useMemo } from 'react'
import { DataTable } from '@/components/tables/DataTable'
import { useTableState } from '@/components/tables/useTableState'
import { EmptyState } from '@/components/ui/EmptyState'
import { greyZone, isGrey } from '@/lib/domain/rankings/rules'
import type { RankingRow, RankingView } from '@/lib/domain/rankings/rankingView'
import { RankingDetail } from './RankingDetail'
import { rankingColumns } from './rankingColumns'

export interface RankingTableProps {
  view: RankingView
  selected: number | null
  onSelect: (proposalId: number | null) => void
}

/** The list: raw mean, merit with its shift, the chance of standing above the line, where the rank could lie. */
export function RankingTable({ view, selected, onSelect }: RankingTableProps) {
  const [{ sort, find }] = useTableState('')
  const columns = useMemo(
    () =>
      rankingColumns({
        callSlug: view.callSlug,
        count: view.rows.length,
        line: view.line,
        zone: greyZone(view.rows.map((row) => row.chance)),
        selected,
        onSelect,
        hasMeasure: view.formula.text !== null,
      }),
    [view, selected, onSelect],
  )
  const inOrder = sort === '' && find === ''
  const detail = (row: RankingRow) => {
    const isLine = inOrder && row.rank === view.line
    if (!isLine && row.proposalId !== selected) return null
    return (
      <RankingDetail
        row={row}
        isOpen={row.proposalId === selected}
        line={isLine ? `line: ${view.line} of ${view.rows.length}` : null}
      />
    )
  }
  return (
    <DataTable
      caption={`Ranking of call ${view.callNumber}`}
      columns={columns}
      rows={view.rows}
      rowId={(row) => String(row.proposalId)}
      find="Number or title"
      csv={`ranking-call-${view.callNumber}`}
      selectedId={selected === null ? null : String(selected)}
      tone={(row) => (isGrey(row.chance) ? 'attention' : null)}
      detail={detail}
      phone="cards"
      empty={
        <EmptyState title="Nothing to rank yet">
          Proposals come to the panel once they are sent in and the call has closed.
        </EmptyState>
      }
    />
  )
}
