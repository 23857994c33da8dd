'use client'

import { useMemo } from 'react'
import { ChartFrame } from '@/components/charts/ChartFrame'
import { LineChart } from '@/components/charts/LineChart'
import type { LineGuide } from '@/components/charts/LineChartMarks'
import type { CurvePlot } from '@/lib/domain/tools/yardstick/curves'
import { formatNumber } from '@/lib/format'
import { toneOf } from './toneOf'

export interface QuantityPlotProps {
  /** The quantity with its unit. */
  title: string
  /** In running words, for screen readers. */
  name: string
  plot: CurvePlot
  redshifts: readonly number[]
  decimals: number
  guides?: readonly LineGuide[]
  /** Plots of ratios need not begin at 0. */
  yDomain?: readonly [number, number]
  fileName: string
  height?: number
  onPoint?: (z: number | null) => void
}

/** Curves by redshift as rows: one column a curve. */
function numbersOf({ curves }: CurvePlot, title: string) {
  const longest = curves.reduce((best, one) => (one.points.length > best.points.length ? one : best), {
    points: [] as [number, number][],
  })
  const values = curves.map(({ points }) => new Map(points))
  return {
    caption: title,
    columns: [{ head: 'z', decimals: 4 }, ...curves.map(({ name }) => ({ head: name, decimals: 4 }))],
    rows: longest.points.map(([z]) => [z, ...values.map((of) => of.get(z) ?? null)]),
  }
}

/** A quantity against redshift, a line a cosmology, with the reader's redshifts on the axis. */
export function QuantityPlot(props: QuantityPlotProps) {
  const { title, name, plot, redshifts, decimals, guides, yDomain, fileName, height = 360, onPoint } = props
  const { curves, domain, log, peak } = plot
  const numbers = useMemo(() => numbersOf(plot, title), [plot, title])
  const shown = curves.filter(({ points }) => points.length > 1)
  const upTo = formatNumber(domain[1], domain[1] < 1 ? 2 : 0)
  const ends = shown.flatMap(({ name: whose, ends: words }) => (words ? [`${whose} ${words}.`] : []))
  return (
    <ChartFrame brief title={title} fileName={fileName} numbers={numbers}>
      <LineChart
        label={`${name} against redshift up to z = ${upTo}. ${ends.join(' ')}`}
        xLabel="redshift z"
        xName="z"
        xDomain={domain}
        xLog={log}
        yDomain={yDomain}
        yDecimals={decimals}
        labels="inside"
        fluid
        height={height}
        marks={redshifts.filter((z) => z >= domain[0] && z <= domain[1])}
        guides={guides}
        notes={
          peak
            ? [
                {
                  x: peak[0],
                  y: peak[1],
                  words: `largest at z = ${formatNumber(peak[0], 2)}: beyond it, things look bigger again`,
                  short: `largest at z = ${formatNumber(peak[0], 2)}`,
                },
              ]
            : []
        }
        series={shown.map((curve) => ({
          id: String(curve.place),
          name: curve.ends ? `${curve.name} ${curve.ends}` : curve.name,
          brief: curve.ends ?? undefined,
          tone: toneOf(curve.place),
          points: curve.points,
          chosen: curve.place === 0,
        }))}
        onPoint={onPoint}
      />
    </ChartFrame>
  )
}
