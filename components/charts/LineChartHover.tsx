import { formatNumber } from '@/lib/format'
import type { LineChartGeometry, LineSeries } from './geometry/lineChart'
import { valueAt } from './geometry/valueAt'

export interface LineChartHoverProps {
  geometry: LineChartGeometry
  series: readonly LineSeries[]
  at: number
  xLabel: string
  xDecimals?: number
  yDecimals?: number
}

/** The values under the pointer: a lamp line, a ring on every curve, its value beside. */
export function LineChartHover({
  geometry: { x, y },
  series,
  at,
  xLabel,
  xDecimals = 3,
  yDecimals = 1,
}: LineChartHoverProps) {
  const [height = 0] = y.range()
  const [, width = 0] = x.range()
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
        {xLabel} = {formatNumber(at, xDecimals)}
      </text>
      {series.map((one) => {
        const value = valueAt(one.points, at)
        if (value === null) return null
        return (
          <g key={one.id} transform={`translate(${x(at)} ${y(value)})`}>
            <circle r="4" fill="var(--ground)" stroke={`var(--${one.tone})`} strokeWidth="1.8" />
            <text
              y="-6"
              {...side}
              fontSize="13"
              fontWeight="600"
              fill={`var(--${one.tone})`}
              className="ground-halo"
            >
              {formatNumber(value, yDecimals)}
            </text>
          </g>
        )
      })}
    </g>
  )
}
