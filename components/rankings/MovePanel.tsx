'use client'

import { useState } from 'react'
import { Button } from '@/components/ui/Button'
import { SectionHeading } from '@/components/ui/SectionHeading'
import type { RankingRow } from '@/lib/domain/rankings/rankingView'
import { MoveForm } from './MoveForm'
import type { RankingActions } from './rankingActions'

export interface MovePanelProps {
  row: RankingRow | null
  count: number
  listKey: { panelId: number; rankingId: number; version: number }
  action: RankingActions['move']
}

/** Moving the chosen proposal by hand; each way asks for a reason. */
export function MovePanel({ row, count, listKey, action }: MovePanelProps) {
  const [place, setPlace] = useState<number | 'ask' | null>(null)
  if (!row)
    return (
      <section>
        <SectionHeading dense title="Move by hand" />
        <p className="mt-2 text-table text-muted">
          Choose a proposal by its number. A rank moved by hand asks for a reason, which the panel reads.
        </p>
      </section>
    )
  return (
    <section>
      <SectionHeading dense title={`${row.reviewNumber} in discussion`} />
      <p className="mt-2 text-table">A rank moved by hand asks for a reason, which the panel reads.</p>
      {place === null ? (
        <div className="mt-3 flex flex-wrap gap-2">
          {row.rank > 1 ? (
            <Button look="secondary" size="small" onClick={() => setPlace(row.rank - 1)}>
              Up
            </Button>
          ) : null}
          {row.rank < count ? (
            <Button look="secondary" size="small" onClick={() => setPlace(row.rank + 1)}>
              Down
            </Button>
          ) : null}
          <Button look="secondary" size="small" onClick={() => setPlace('ask')}>
            To rank …
          </Button>
        </div>
      ) : (
        <div className="mt-3">
          <MoveForm
            row={row}
            place={place}
            listKey={listKey}
            action={action}
            onLeave={() => setPlace(null)}
          />
        </div>
      )}
    </section>
  )
}
