import type { ReactNode } from 'react'

export interface KeyFigureProps {
  value: ReactNode
  label: ReactNode
}

/** One number that matters, with what it is under it. */
export function KeyFigure({ value, label }: KeyFigureProps) {
  return (
    <div>
      <div className="text-figure">{value}</div>
      <div className="text-caption text-muted">{label}</div>
    </div>
  )
}
