import { rankScale, type RankSpread } from './geometry/rankInterval'

export interface RankIntervalProps extends RankSpread {
  /** How many are ranked. */
  count: number
  /** The last rank above the line. */
  line: number
  /** Ranks spanned by the grey zone. */
  zone?: readonly [number, number]
  /** In the grey zone itself: drawn in lamp. */
  grey?: boolean
  width?: number
}

const height = 38
const middle = height / 2

/** Where a rank could lie: 90 % line, middle half, rank by merit as a tick, rank by raw mean behind. */
export function RankInterval(props: RankIntervalProps) {
  const { count, line, zone, grey = false, width = 236, merit, raw, low, high, lowerHalf, upperHalf } = props
  const x = rankScale(count, width)
  const colour = grey ? 'var(--lamp)' : 'var(--s1)'
  return (
    <svg
      role="img"
      aria-label={`rank ${merit} by merit, 90 % between ${low} and ${high}; rank ${raw} by raw mean`}
      width={width}
      height={height}
      className="block"
    >
      {zone ? (
        <rect
          x={x(zone[0] - 0.5)}
          width={x(zone[1] + 0.5) - x(zone[0] - 0.5)}
          height={height}
          fill="var(--lamp)"
          opacity="0.09"
        />
      ) : null}
      <path
        d={`M${x(line + 0.5)} 0V${height}`}
        stroke="var(--lamp)"
        strokeWidth="1.4"
        strokeDasharray="4 3.6"
      />
      <path d={`M${x(low)} ${middle}H${x(high)}`} stroke={colour} strokeWidth="1.5" />
      <rect
        x={x(lowerHalf)}
        y={middle - 3.5}
        width={x(upperHalf) - x(lowerHalf)}
        height="7"
        fill={colour}
        opacity="0.28"
      />
      <rect x={x(raw) - 0.6} y={middle - 11} width="1.2" height="22" fill="var(--ink-muted)" />
      <rect x={x(merit) - 1.5} y={middle - 7} width="3" height="14" fill={colour} />
    </svg>
  )
}
