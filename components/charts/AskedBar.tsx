import { formatHours } from '@/lib/format'

export interface AskedBarProps {
  trueHours: number
  computedHours: number
  askedHours: number
  maxHours: number
  width?: number
}

/** True hours as a bar against the asked hours as a tick; the computed ones dashed. */
export function AskedBar({ trueHours, computedHours, askedHours, maxHours, width = 250 }: AskedBarProps) {
  const x = (hours: number) => Math.round((width * Math.min(hours, maxHours) * 10) / maxHours) / 10
  return (
    <svg
      role="img"
      aria-label={`true ${formatHours(trueHours)}, computed ${formatHours(computedHours)}, asked ${formatHours(askedHours)}`}
      width={width}
      height="20"
      className="block"
    >
      <path d={`M0 19.5H${width}`} stroke="var(--grid)" />
      <rect
        y="5"
        width={x(trueHours)}
        height="10"
        fill={trueHours > askedHours ? 'var(--not-feasible)' : 'var(--s1)'}
      />
      <path d={`M${x(computedHours)} 2V18`} stroke="var(--ink-muted)" strokeDasharray="3 2" />
      <path d={`M${Math.min(width - 1, x(askedHours))} 0V20`} stroke="var(--ink)" strokeWidth="1.8" />
    </svg>
  )
}
