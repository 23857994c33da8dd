'use client'

import type { ReactNode } from 'react'
import { Button } from '@/components/ui/Button'
import { formatUtcClock } from '@/lib/format'

export interface StaleComparisonProps {
  changedBy: string
  changedAt: Date | string
  /** What differs, with the field's label. */
  rows: { label: string; theirs: ReactNode; yours: ReactNode }[]
  onKeepTheirs: () => void
  onKeepMine: () => void
  busy?: boolean
}

/** Someone else saved the same thing first: theirs beside yours, and nothing is overwritten until one is chosen. */
export function StaleComparison({
  changedBy,
  changedAt,
  rows,
  onKeepTheirs,
  onKeepMine,
  busy,
}: StaleComparisonProps) {
  const at = typeof changedAt === 'string' ? new Date(changedAt) : changedAt
  return (
    <section
      role="alert"
      className="rounded border border-l-4 border-edge border-l-lamp bg-surface p-4 text-table"
      aria-label={`${changedBy} changed this`}
    >
      <h2 className="text-body font-semibold">
        {changedBy} changed this at {formatUtcClock(at)}
      </h2>
      <div className="mt-2 grid grid-cols-2 gap-x-6 gap-y-1">
        <span className="text-muted">theirs</span>
        <span className="text-muted">yours, not kept yet</span>
        {rows.map((row) => (
          <div key={row.label} className="contents">
            <div className="[overflow-wrap:anywhere]">
              {row.label} <strong className="font-semibold">{row.theirs}</strong>
            </div>
            <div className="[overflow-wrap:anywhere]">
              {row.label} <strong className="font-semibold">{row.yours}</strong>
            </div>
          </div>
        ))}
      </div>
      <div className="mt-4 flex gap-3">
        <Button look="secondary" size="small" onClick={onKeepTheirs} busy={busy}>
          Keep theirs
        </Button>
        <Button look="secondary" size="small" onClick={onKeepMine} busy={busy}>
          Keep mine
        </Button>
      </div>
    </section>
  )
}
