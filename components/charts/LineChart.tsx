'use client'

import { useState } from 'react'
import { LineChartHover } from './LineChartHover'
import { LineChartPlot, type LineGuide } from './LineChartPlot'
import { lineChart, type LineSeries } from './geometry/lineChart'

export interface LineChartProps {
  /** What screen readers hear: the chart in a sentence. */
  label: string
  series: readonly LineSeries[]
  /** Under the axis at the right: `redshift z`. */
  xLabel: string
  xDomain?: readonly [number, number]
  yDomain?: readonly [number, number]
  log?: boolean
  /** Level lines with words: `wanted: 30`. */
  guides?: readonly LineGuide[]
  /** Values marked on the x axis: the reader's redshifts. */
  marks?: readonly number[]
  xDecimals?: number
  yDecimals?: number
  /** Told of the x under the pointer, so that a table row can light. */
  onPoint?: (x: number | null) => void
  height?: number
}

const width = 640
const margin = { top: 12, right: 132, bottom: 44, left: 64 }

/** Lines with their names beside them; the pointer (or the arrow keys) reads values off every line at once. */
export function LineChart(props: LineChartProps) {
  const { label, series, xDomain, yDomain, log, height = 320, onPoint, marks = [] } = props
  const [at, setAt] = useState<number | null>(null)
  const geometry = lineChart({
    series,
    width: width - margin.left - margin.right,
    height: height - margin.top - margin.bottom,
    xDomain,
    yDomain,
    log,
  })
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
        point((at ?? from) + (step * (to - from)) / 50)
      }}
    >
      <g transform={`translate(${margin.left} ${margin.top})`}>
        <LineChartPlot {...props} geometry={geometry} marks={marks} />
        {at !== null ? <LineChartHover {...props} geometry={geometry} at={at} /> : null}
      </g>
    </svg>
  )
}
