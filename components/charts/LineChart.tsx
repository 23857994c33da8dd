'use client'

import { useMemo, useState } from 'react'
import { LineChartHover } from './LineChartHover'
import type { LineGuide, LineNote, LineUpright } from './LineChartMarks'
import { LineChartPlot } from './LineChartPlot'
import { lineChart, type LineSeries } from './geometry/lineChart'
import { useMeasuredWidth } from './useMeasuredWidth'

export interface LineChartProps {
  /** What screen readers hear: the chart in a sentence. */
  label: string
  series: readonly LineSeries[]
  /** Under the axis at the right: `redshift z`. */
  xLabel: string
  xDomain?: readonly [number, number]
  yDomain?: readonly [number, number]
  log?: boolean
  /** For x over many decades; its domain must then be given, above 0. */
  xLog?: boolean
  /** Where the names stand: at the right of the plot (the default), or inside at their lines. */
  labels?: 'beside' | 'inside'
  /** As wide as its place, with type that keeps its size; else it is scaled from 640. */
  fluid?: boolean
  /** Level lines with words: `wanted: 30`. */
  guides?: readonly LineGuide[]
  /** Upright lines with words: `now`. */
  uprights?: readonly LineUpright[]
  /** Points with words over a stem: where a curve is largest. */
  notes?: readonly LineNote[]
  /** Values marked on the x axis: the reader's redshifts. */
  marks?: readonly number[]
  /** What x is called where its value is read: `z`; without it the words of the axis. */
  xName?: string
  xDecimals?: number
  yDecimals?: number
  /** Told of the x under the pointer, so that a table row can light. */
  onPoint?: (x: number | null) => void
  height?: number
}

const usualWidth = 640
const roomBeside = 132

/** Words that stand on a plot whatever its lines do. */
function standingWords(
  notes: LineChartProps['notes'] = [],
  uprights: LineChartProps['uprights'] = [],
  yDomain: LineChartProps['yDomain'],
) {
  return [
    ...notes.map(({ x, y, words }) => ({ x, y, text: words, dy: -18 })),
    ...uprights.map(({ x, words }) => ({ x, y: yDomain?.[0] ?? 0, text: words, dy: -10 })),
  ]
}

/** Lines with their names beside them; the pointer (or the arrow keys) reads values off every line at once. */
export function LineChart(props: LineChartProps) {
  const { label, height = 320, labels = 'beside', fluid = false, onPoint, marks = [] } = props
  const { series, xDomain, yDomain, log, xLog, notes, uprights } = props
  const [at, setAt] = useState<number | null>(null)
  const { element, width } = useMeasuredWidth<SVGSVGElement>(usualWidth, fluid)
  const left = width < 420 ? 52 : 64
  const right = labels === 'beside' ? roomBeside : 10
  const margin = { top: labels === 'beside' ? 12 : props.notes?.length ? 36 : 22, bottom: 44, left, right }
  const [plotWidth, plotHeight] = [width - left - right, height - margin.top - margin.bottom]
  const words = useMemo(() => standingWords(notes, uprights, yDomain), [notes, uprights, yDomain])
  const geometry = useMemo(
    () =>
      lineChart({ series, width: plotWidth, height: plotHeight, xDomain, yDomain, log, xLog, labels, words }),
    [series, plotWidth, plotHeight, xDomain, yDomain, log, xLog, labels, words],
  )
  const [from = 0, to = 1] = geometry.x.domain()

  const point = (x: number | null) => {
    // Near one of the reader's own values the line snaps to it.
    const near = x === null ? undefined : marks.find((mark) => Math.abs(geometry.x(mark) - geometry.x(x)) < 6)
    const next = x === null ? null : Math.min(to, Math.max(from, near ?? x))
    setAt(next)
    onPoint?.(next)
  }

  return (
    <svg
      ref={element}
      style={fluid ? { height } : undefined}
      preserveAspectRatio="xMinYMin meet"
      viewBox={`0 0 ${width} ${height}`}
      className="block w-full overflow-visible focus-visible:outline-3 focus-visible:outline-lamp"
      role="img"
      aria-label={`${label} Arrow keys read values.`}
      tabIndex={0}
      onPointerLeave={() => point(null)}
      onPointerMove={(event) => {
        const box = event.currentTarget.getBoundingClientRect()
        const x = ((event.clientX - box.left) / box.width) * width - margin.left
        point(geometry.x.invert(x))
      }}
      onBlur={() => point(null)}
      onKeyDown={(event) => {
        const step = event.key === 'ArrowRight' ? 1 : event.key === 'ArrowLeft' ? -1 : 0
        if (step === 0) return
        event.preventDefault()
        const px = geometry.x(at ?? from) + (step * plotWidth) / 50
        point(geometry.x.invert(px))
      }}
    >
      <g transform={`translate(${margin.left} ${margin.top})`}>
        <LineChartPlot {...props} geometry={geometry} marks={marks} />
        {at !== null ? <LineChartHover {...props} geometry={geometry} at={at} /> : null}
      </g>
    </svg>
  )
}
