import { scaleLinear, scaleLog, type ScaleContinuousNumeric } from 'd3-scale'
import { line } from 'd3-shape'
import type { SeriesTone } from './chartTypes'

export interface LineSeries {
  id: string
  name: string
  tone: SeriesTone
  /** In order of x; a gap is a new series. */
  points: readonly (readonly [number, number])[]
  /** Drawn a little heavier. */
  chosen?: boolean
}

export interface LineChartInput {
  series: readonly LineSeries[]
  width: number
  height: number
  /** Without them: from 0 (or the smallest) to the largest. */
  xDomain?: readonly [number, number]
  yDomain?: readonly [number, number]
  log?: boolean
}

export interface LinePath {
  id: string
  name: string
  tone: SeriesTone
  chosen: boolean
  d: string
  /** Where the series' name stands, at the line. */
  label: { x: number; y: number }
}

export interface LineChartGeometry {
  x: ScaleContinuousNumeric<number, number>
  y: ScaleContinuousNumeric<number, number>
  xTicks: number[]
  yTicks: number[]
  paths: LinePath[]
}

const labelGap = 16

/** Scales, ticks, paths and label places of a line chart, in the plot's own coordinates. */
export function lineChart({
  series,
  width,
  height,
  xDomain,
  yDomain,
  log,
}: LineChartInput): LineChartGeometry {
  const xs = series.flatMap(({ points }) => points.map(([x]) => x))
  const ys = series.flatMap(({ points }) => points.map(([, y]) => y)).filter(Number.isFinite)
  const scale = log ? scaleLog : scaleLinear
  const x = scaleLinear()
    .domain(xDomain ?? [Math.min(0, ...xs), Math.max(...xs)])
    .range([0, width])
  const y = scale()
    .domain(yDomain ?? [log ? Math.min(...ys) : Math.min(0, ...ys), Math.max(...ys)])
    .range([height, 0])
  if (!yDomain) y.nice()
  const path = line<readonly [number, number]>()
    .defined(([, value]) => Number.isFinite(value))
    .x(([value]) => Math.round(x(value) * 10) / 10)
    .y(([, value]) => Math.round(y(value) * 10) / 10)
  const paths = series.map((one): LinePath => {
    const last = one.points[one.points.length - 1] ?? [0, 0]
    return {
      id: one.id,
      name: one.name,
      tone: one.tone,
      chosen: one.chosen ?? false,
      d: path(one.points) ?? '',
      label: { x: x(last[0]), y: y(last[1]) },
    }
  })
  return { x, y, xTicks: x.ticks(7), yTicks: y.ticks(5), paths: spreadLabels(paths, height) }
}

/** Keeps names that would touch apart, moving each as little as the order allows. */
function spreadLabels(paths: LinePath[], height: number): LinePath[] {
  const order = [...paths].sort((a, b) => a.label.y - b.label.y)
  order.forEach((path, index) => {
    const above = order[index - 1]
    path.label.y = Math.max(path.label.y, above ? above.label.y + labelGap : 0)
  })
  const overshoot = (order[order.length - 1]?.label.y ?? 0) - height
  if (overshoot > 0) {
    order.reverse().forEach((path, index) => {
      const below = order[index - 1]
      path.label.y = Math.min(path.label.y, below ? below.label.y - labelGap : height)
    })
  }
  return paths
}
