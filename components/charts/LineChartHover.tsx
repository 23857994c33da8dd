import { formatNumber, formatSignificant } from '@/lib/format'
import type { LineChartGeometry, LineSeries } from './geometry/lineChart'
import { valueAt } from './geometry/valueAt'

export interface LineChartHoverProps {
  geometry: LineChartGeometry
  series: readonly LineSeries[]
  at: number
  xLabel: string
  xName?: string
  xDecimals?: number
  yDecimals?: number
}

/** The values under the pointer: a lamp line, a ring on every curve, its value beside. */
export function LineChartHover({
  geometry: { x, y },
  series,
  at,
  xLabel,
  xName = xLabel,
  xDecimals = 3,
  yDecimals = 1,
}: LineChartHoverProps) {
  const [height = 0] = y.range()
  const [, width = 0] = x.range()
  // Values of curves that nearly touch are kept a line apart.
  const read = series
    .flatMap((one) => {
      const value = valueAt(one.points, at)
      return value === null ? [] : [{ one, value, wordsAt: y(value) - 6 }]
    })
    .sort((a, b) => a.wordsAt - b.wordsAt)
  read.forEach((now, index) => {
    const above = read[index - 1]
    now.wordsAt = Math.max(now.wordsAt, above ? above.wordsAt + 15 : 16)
  })
  const leftSide = x(at) > width * 0.8
  const side = leftSide ? { dx: -9, textAnchor: 'end' as const } : { dx: 9, textAnchor: 'start' as const }
  return (
    <g pointerEvents="none">
      <path d={`M${x(at)} 0V${height}`} stroke="var(--lamp)" />
      <text
        x={x(at)}
        y="2"
        {...side}
        fontSize="13"
        fontWeight="600"
        fill="var(--lamp)"
        className="ground-halo"
      >
        {xName} = {formatNumber(at, xDecimals)}
      </text>
      {read.map(({ one, value, wordsAt }) => (
        <g key={one.id} transform={`translate(${x(at)} 0)`}>
          <circle cy={y(value)} r="4" fill="var(--ground)" stroke={`var(--${one.tone})`} strokeWidth="1.8" />
          <text
            y={wordsAt}
            {...side}
            fontSize="13"
            fontWeight="600"
            fill={`var(--${one.tone})`}
            className="ground-halo"
          >
            {Math.abs(value) >= 1e6 ? formatSignificant(value, 4) : formatNumber(value, yDecimals)}
          </text>
        </g>
      ))}
    </g>
  )
}
