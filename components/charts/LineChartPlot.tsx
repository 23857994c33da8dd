import { formatNumber, formatSignificant } from '@/lib/format'
import { LineChartMarks, type LineChartMarksProps } from './LineChartMarks'
import { seriesDashes } from './geometry/chartTypes'
import { LABEL_DROP, LABEL_GAP, type LineChartGeometry } from './geometry/lineChart'

export interface LineChartPlotProps extends Partial<Omit<LineChartMarksProps, 'geometry'>> {
  geometry: LineChartGeometry
  xLabel: string
  marks: readonly number[]
}

/** More values than this are drawn as the stretch they cover. */
const MOST_TICKS = 60

const decimalsOf = (ticks: readonly number[]) => {
  const step = Math.abs((ticks[1] ?? 1) - (ticks[0] ?? 0))
  return step >= 1 ? 0 : Math.min(6, Math.ceil(-Math.log10(step)))
}

const formatTick = (tick: number, decimals: number) =>
  Math.abs(tick) >= 1e7 ? formatSignificant(tick, 2) : formatNumber(tick, decimals)

/** Decades of a logarithmic axis are not evenly apart: each has its own decimals. */
function xWords(tick: number, ticks: readonly number[]): string {
  const [a = 0, b = 0, c = 0] = ticks
  const decades = ticks.length > 2 && a > 0 && c - b > 2 * (b - a)
  return decades
    ? formatTick(tick, Math.max(0, -Math.floor(Math.log10(tick))))
    : formatTick(tick, decimalsOf(ticks))
}

/** Grid, axis, lines and their names. */
export function LineChartPlot({
  geometry,
  xLabel,
  guides = [],
  uprights = [],
  notes = [],
  marks,
}: LineChartPlotProps) {
  const { x, y, xTicks, yTicks, paths } = geometry
  const [, width = 0] = x.range()
  const [height = 0] = y.range()
  return (
    <>
      {yTicks.map((tick) => (
        <g key={tick} transform={`translate(0 ${y(tick)})`}>
          <path d={`M0 0H${width}`} stroke="var(--grid)" />
          <text x="-10" dy="4" textAnchor="end" fontSize="12" fill="var(--ink-muted)">
            {formatTick(tick, decimalsOf(yTicks))}
          </text>
        </g>
      ))}
      <path d={`M0 ${height}H${width}`} stroke="var(--ink)" />
      {xTicks.map((tick) => (
        <g key={tick} transform={`translate(${x(tick)} ${height})`}>
          <path d="M0 0V6" stroke="var(--ink)" />
          <text y="20" textAnchor="middle" fontSize="12" fill="var(--ink-muted)">
            {xWords(tick, xTicks)}
          </text>
        </g>
      ))}
      <text x={width} y={height + 38} textAnchor="end" fontSize="12.5" fill="var(--ink-muted)">
        {xLabel}
      </text>
      {marks.length > MOST_TICKS ? (
        <path
          d={`M${x(Math.min(...marks))} ${height - 2}H${x(Math.max(...marks))}`}
          stroke="var(--lamp)"
          strokeWidth="4"
        />
      ) : (
        marks.map((mark, index) => (
          <path key={index} d={`M${x(mark)} ${height}V${height - 7}`} stroke="var(--lamp)" strokeWidth="2" />
        ))
      )}
      <LineChartMarks geometry={geometry} guides={guides} uprights={uprights} notes={notes} />
      {/* Powers may differ in their last bit between server and browser: a tenth of a pixel, redrawn in a moment. */}
      {paths.map((path) => (
        <g key={path.id}>
          <path
            suppressHydrationWarning
            d={path.d}
            fill="none"
            stroke={`var(--${path.tone})`}
            strokeWidth={path.chosen ? 2.5 : 2.25}
            strokeDasharray={seriesDashes[path.tone]}
          />
          <text
            suppressHydrationWarning
            x={path.label.x + LABEL_GAP}
            y={path.label.y + LABEL_DROP}
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
