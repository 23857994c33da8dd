import { formatHours } from '@/lib/format'

export interface DemandBarProps {
  askedHours: number
  shareHours: number
  /** The hours of a bar of full width. */
  maxHours: number
  width?: number
}

/** Hours asked as a bar, lighter beyond the share; the share as a tick. */
export function DemandBar({ askedHours, shareHours, maxHours, width = 180 }: DemandBarProps) {
  const x = (hours: number) => Math.round(((width - 2) * Math.min(hours, maxHours) * 10) / maxHours) / 10
  const within = x(Math.min(askedHours, shareHours))
  return (
    <svg
      role="img"
      aria-label={`${formatHours(askedHours)} asked, a share of ${formatHours(shareHours)}`}
      width={width}
      height="20"
      className="block"
    >
      <path d={`M0 17.5H${width}`} stroke="var(--grid)" />
      <rect y="4" width={within} height="13" fill="var(--s1)" />
      <rect
        x={within}
        y="4.5"
        width={Math.max(0, x(askedHours) - within)}
        height="12"
        fill="var(--surface)"
        stroke="var(--s1)"
      />
      <path d={`M${x(shareHours) + 1} 0V20`} stroke="var(--ink)" strokeWidth="1.8" />
    </svg>
  )
}
