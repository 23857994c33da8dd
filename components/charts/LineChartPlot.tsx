import { formatNumber } from '@/lib/format'
import { seriesDashes } from './geometry/chartTypes'
import type { LineChartGeometry } from './geometry/lineChart'

export interface LineGuide {
  y: number
  words: string
}

export interface LineChartPlotProps {
  geometry: LineChartGeometry
  xLabel: string
  guides?: readonly LineGuide[]
  marks: readonly number[]
}

const decimalsOf = (ticks: readonly number[]) => {
  const step = Math.abs((ticks[1] ?? 1) - (ticks[0] ?? 0))
  return step >= 1 ? 0 : Math.min(6, Math.ceil(-Math.log10(step)))
}

/** Grid, axis, lines and their names. */
export function LineChartPlot({
  geometry: { x, y, xTicks, yTicks, paths },
  xLabel,
  guides = [],
  marks,
}: LineChartPlotProps) {
  const [, width = 0] = x.range()
  const [height = 0] = y.range()
  return (
    <>
      {yTicks.map((tick) => (
        <g key={tick} transform={`translate(0 ${y(tick)})`}>
          <path d={`M0 0H${width}`} stroke="var(--grid)" />
          <text x="-10" dy="4" textAnchor="end" fontSize="12" fill="var(--ink-muted)">
            {formatNumber(tick, decimalsOf(yTicks))}
          </text>
        </g>
      ))}
      <path d={`M0 ${height}H${width}`} stroke="var(--ink)" />
      {xTicks.map((tick) => (
        <g key={tick} transform={`translate(${x(tick)} ${height})`}>
          <path d="M0 0V6" stroke="var(--ink)" />
          <text y="20" textAnchor="middle" fontSize="12" fill="var(--ink-muted)">
            {formatNumber(tick, decimalsOf(xTicks))}
          </text>
        </g>
      ))}
      <text x={width} y={height + 38} textAnchor="end" fontSize="12.5" fill="var(--ink-muted)">
        {xLabel}
      </text>
      {marks.map((mark) => (
        <path key={mark} d={`M${x(mark)} ${height}V${height - 7}`} stroke="var(--lamp)" strokeWidth="2" />
      ))}
      {guides.map((guide) => (
        <g key={guide.words}>
          <path d={`M0 ${y(guide.y)}H${width}`} stroke="var(--lamp)" strokeDasharray="4 3.6" />
          <text
            x="4"
            y={y(guide.y) - 5}
            fontSize="12"
            fontWeight="600"
            fill="var(--lamp)"
            className="ground-halo"
          >
            {guide.words}
          </text>
        </g>
      ))}
      {paths.map((path) => (
        <g key={path.id}>
          <path
            d={path.d}
            fill="none"
            stroke={`var(--${path.tone})`}
            strokeWidth={path.chosen ? 2.5 : 2.25}
            strokeDasharray={seriesDashes[path.tone]}
          />
          <text
            x={path.label.x + 8}
            y={path.label.y + 4}
            fontSize="13"
            fontWeight="600"
            fill={`var(--${path.tone})`}
            className="ground-halo"
          >
            {path.name}
          </text>
        </g>
      ))}
    </>
  )
}
