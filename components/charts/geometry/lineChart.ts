import { scaleLinear, scaleLog, type ScaleContinuousNumeric } from 'd3-scale'
import { line } from 'd3-shape'
import type { SeriesTone } from './chartTypes'
import { LETTER, placeLabels, wordBox } from './placeLabels'

export interface LineSeries {
  id: string
  name: string
  /** What stands at its line where the name would take most of the plot. */
  brief?: string
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
  /** For x over many decades; its domain must then be given, above 0. */
  xLog?: boolean
  /** Where the names stand: at the right of the plot (the default), or inside at their lines. */
  labels?: 'beside' | 'inside'
  /** Words that stand on the plot already: names inside keep clear of them. `dy` from their point to their baseline. */
  words?: readonly { x: number; y: number; text: string; dy: number }[]
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
/** A name begins this far right of its line's end, and this far below it. */
export const LABEL_GAP = 8
export const LABEL_DROP = 4

/** Scales, ticks, paths and label places of a line chart, in the plot's own coordinates. */
export function lineChart({
  series,
  width,
  height,
  xDomain,
  yDomain,
  log,
  xLog,
  labels = 'beside',
  words = [],
}: LineChartInput): LineChartGeometry {
  const xs = series.flatMap(({ points }) => points.map(([x]) => x))
  const ys = series.flatMap(({ points }) => points.map(([, y]) => y)).filter(Number.isFinite)
  const scale = log ? scaleLog : scaleLinear
  const x = (xLog ? scaleLog : scaleLinear)()
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
      name: one.brief && one.name.length * LETTER > width * 0.8 ? one.brief : one.name,
      tone: one.tone,
      chosen: one.chosen ?? false,
      d: path(one.points) ?? '',
      label: { x: x(last[0]), y: y(last[1]) },
    }
  })
  const xTicks = xLog ? decadeTicks(x.domain()) : x.ticks(width < 360 ? 4 : 7)
  if (labels === 'beside') return { x, y, xTicks, yTicks: y.ticks(5), paths: spreadLabels(paths, height) }
  const inside = placeLabels(
    series.map(({ id, points }, index) => ({
      id,
      words: paths[index]?.name ?? '',
      points: points.filter(([, value]) => Number.isFinite(value)).map(([px, py]) => [x(px), y(py)] as const),
    })),
    width,
    height,
    words.map(({ x: at, y: level, text, dy }) => wordBox(x(at), y(level) + dy, text, width)),
  )
  inside.forEach((label, index) => {
    const path = paths[index]
    if (path) path.label = { x: label.x - LABEL_GAP, y: label.y - LABEL_DROP }
  })
  return { x, y, xTicks, yTicks: y.ticks(5), paths }
}

/** Whole powers of ten within a domain. */
function decadeTicks(domain: readonly number[]): number[] {
  const [from = 1, to = 1] = domain.map(Math.log10)
  const first = Math.ceil(from - 1e-9)
  return Array.from({ length: Math.floor(to + 1e-9) - first + 1 }, (_, i) => 10 ** (first + i))
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
