'use client'

import { useMemo } from 'react'
import { DataTable } from '@/components/tables/DataTable'
import { BarNote } from '@/components/ui/BarNote'
import type { SharedRow, SharingView } from '@/lib/domain/sharing/sharingView'
import { formatUtc } from '@/lib/format'
import { sharedColumns } from './sharedColumns'

export interface SharedTableProps {
  view: SharingView
  selected: number | null
  onSelect: (proposalId: number | null) => void
}

function Moves({ row }: { row: SharedRow }) {
  return (
    <div className="flex flex-col gap-1 pb-2 text-table text-muted">
      <p className="m-0">
        Rank {row.rank} of {row.panel}. {row.isNear ? 'Near a line: the meeting may move it.' : ''}
      </p>
      {row.moves.map((move) => (
        <p key={move.at} className="m-0">
          Moved {move.isUp ? 'up' : 'down'} by {move.by ?? 'the meeting'}, {formatUtc(new Date(move.at))}:{' '}
          {move.reason}
        </p>
      ))}
    </div>
  )
}

/** The lists of all panels as one, or why they are not one yet. */
export function SharedTable({ view, selected, onSelect }: SharedTableProps) {
  const columns = useMemo(() => sharedColumns(selected, onSelect), [selected, onSelect])
  if (view.rows.length === 0)
    return (
      <BarNote tone="lamp">
        {view.whyNotTogether ?? 'There is no proposal of this call that you may see.'}
      </BarNote>
    )
  return (
    <DataTable
      caption={`Order of all panels of call ${view.callNumber}`}
      columns={columns}
      rows={view.rows}
      rowId={(row) => String(row.proposalId)}
      find="Number, title or panel"
      chips={[{ id: 'near', label: 'Near the lines', matches: (row) => row.isNear }]}
      csv={`panels-call-${view.callNumber}`}
      selectedId={selected === null ? null : String(selected)}
      tone={(row) => (row.isNear ? 'attention' : null)}
      detail={(row) => (row.proposalId === selected ? <Moves row={row} /> : null)}
      phone="cards"
    />
  )
}
