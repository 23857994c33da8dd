import { formatNumber } from '@/lib/format'
import { hoursBar, type HoursAwarded } from './geometry/hoursBar'

export interface HoursBarProps extends HoursAwarded {
  /** The hours of a bar of full width. */
  maxHours: number
  /** Grows to the left on the left side of facing bars. */
  side?: 'left' | 'right'
  tone?: 's1' | 's3' | 'lamp'
  width?: number
}

const height = 14

/** Hours asked as an outline, given as the fill, the least useful award as a tick. */
export function HoursBar({
  asked,
  given,
  least,
  maxHours,
  side = 'right',
  tone = 's1',
  width = 120,
}: HoursBarProps) {
  const bar = hoursBar({ asked, given, least }, maxHours, width)
  return (
    <svg
      role="img"
      aria-label={`${formatNumber(given, 1)} of ${formatNumber(asked, 1)} hours`}
      width={width}
      height="20"
      className="inline-block align-middle"
    >
      <g transform={side === 'left' ? `translate(${width} 0) scale(-1 1)` : undefined}>
        <rect
          x="0.5"
          y="3.5"
          width={Math.max(0, bar.asked - 1)}
          height={height - 1}
          fill="var(--surface)"
          stroke="var(--edge)"
        />
        <rect y="3" width={bar.given} height={height} fill={`var(--${tone})`} />
        {bar.least !== null ? (
          <path
            d={`M${bar.least} 0V20`}
            stroke="var(--ink)"
            strokeWidth="1.4"
            style={{ filter: 'drop-shadow(1px 0 0 var(--surface)) drop-shadow(-1px 0 0 var(--surface))' }}
          />
        ) : null}
      </g>
    </svg>
  )
}
