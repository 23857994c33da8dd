export interface HoursMarkProps {
  /** Places along the row, percent; null where it is not reached. */
  low: number | null
  high: number | null
  asked: number
  isSpan: boolean
  isOver: boolean
}

/** One row of hours needed: a dot, or a bar with ends; an arrow off the row where it is not reached. */
export function HoursMark({ low, high, asked, isSpan, isOver }: HoursMarkProps) {
  const colour = isOver ? 'var(--not-feasible)' : 'var(--s1)'
  const from = low ?? 100
  const to = high ?? 100
  return (
    <svg width="0" className="h-6 min-w-0 flex-1 overflow-visible" aria-hidden="true">
      <line x1="0" x2="100%" y1="12" y2="12" stroke="var(--grid)" />
      <line x1={`${asked}%`} x2={`${asked}%`} y1="0" y2="24" stroke="var(--ink)" strokeWidth="1.6" />
      {isSpan ? (
        <g stroke={colour} strokeWidth="2">
          <line x1={`${from}%`} x2={`${to}%`} y1="12" y2="12" />
          <line x1={`${from}%`} x2={`${from}%`} y1="7" y2="17" />
          {high === null ? null : <line x1={`${to}%`} x2={`${to}%`} y1="7" y2="17" />}
        </g>
      ) : low === null ? null : (
        <circle cx={`${from}%`} cy="12" r="4.5" fill={colour} />
      )}
    </svg>
  )
}
