import { formatNumber } from '@/lib/format'

export interface MonthSparklineProps {
  months: readonly { month: string; sum: number }[]
  /** The value of a full bar; without it the largest of these. */
  max?: number
}

const height = 22
const bar = 7
const step = 9

/** Hours a month as small bars, in a table's cell. */
export function MonthSparkline({ months, max }: MonthSparklineProps) {
  const most = max ?? Math.max(1e-9, ...months.map(({ sum }) => sum))
  const label = months.map(({ month, sum }) => `${month} ${formatNumber(sum, 0)} h`).join(', ')
  return (
    <svg
      role="img"
      aria-label={label}
      width={months.length * step}
      height={height}
      className="inline-block align-bottom"
    >
      <path d={`M0 ${height - 0.5}H${months.length * step - 2}`} stroke="var(--edge)" />
      {months.map(({ month, sum }, index) => {
        const tall = Math.round(((height - 2) * Math.min(sum, most) * 10) / most) / 10
        return (
          <rect
            key={month}
            x={index * step}
            y={height - 1 - tall}
            width={bar}
            height={tall}
            fill="var(--s1)"
          />
        )
      })}
    </svg>
  )
}
