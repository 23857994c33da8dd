'use client'

import { useMemo } from 'react'
import { ChartFrame } from '@/components/charts/ChartFrame'
import type { LineSeries } from '@/components/charts/geometry/lineChart'
import { LineChart } from '@/components/charts/LineChart'
import type { TypedRow } from '@/lib/domain/facility/recordForm'
import type { TableKind } from '@/lib/domain/facility/rules'
import { bands } from '@/lib/science/light'

const words: Record<TableKind, { title: string; file: string; yDecimals: number }> = {
  throughput: { title: 'Efficiency', file: 'efficiency', yDecimals: 3 },
  extinction: { title: 'Extinction, mag an airmass', file: 'extinction', yDecimals: 2 },
  'dark-sky': { title: 'Dark sky, AB mag arcsec⁻²', file: 'dark-sky', yDecimals: 2 },
}

/** Rows that can be drawn, against wavelength; bands stand at their middle. */
function pointsOf(rows: readonly TypedRow[], kind: TableKind): [number, number][] {
  return rows
    .map(({ at, value }): [number, number] => [
      kind === 'throughput' ? Number(at) : (bands[at.trim()]?.wavelengthA ?? NaN),
      value.trim() === '' ? NaN : Number(value),
    ])
    .filter(([x, y]) => x > 0 && Number.isFinite(y))
    .sort(([a], [b]) => a - b)
}

export interface RecordTablePlotProps {
  kind: TableKind
  /** What the newest record says. */
  before: readonly TypedRow[]
  /** What is to be saved. */
  after: readonly TypedRow[]
}

/** The table as saved and as it would be, as lines over wavelength, with both as numbers. */
export function RecordTablePlot({ kind, before, after }: RecordTablePlotProps) {
  const [old, next] = useMemo(
    () => [pointsOf(before, kind), pointsOf(after, kind)] as const,
    [before, after, kind],
  )
  const isSame = JSON.stringify(old) === JSON.stringify(next)
  const series = useMemo(() => {
    const lines: LineSeries[] = []
    if (old.length > 1) lines.push({ id: 'old', name: isSame ? 'as saved' : 'old', tone: 's1', points: old })
    if (!isSame && next.length > 1)
      lines.push({ id: 'new', name: 'new', tone: 's2', points: next, chosen: true })
    return lines
  }, [old, next, isSame])
  if (series.length === 0) return null
  const all = series.flatMap(({ points }) => points)
  const [xs, ys] = [all.map(([x]) => x), all.map(([, y]) => y)]
  const { title, file, yDecimals } = words[kind]
  const yDomain =
    kind === 'dark-sky'
      ? ([Math.floor(Math.min(...ys) - 0.5), Math.ceil(Math.max(...ys) + 0.01)] as const)
      : ([0, Math.max(...ys) * 1.15 || 1] as const)
  const values = (points: readonly (readonly [number, number])[]) => new Map(points)
  const [oldAt, nextAt] = [values(old), values(next)]
  return (
    <ChartFrame
      title={title}
      fileName={`${file}-old-and-new`}
      brief
      numbers={{
        caption: `${title}, old and new`,
        columns: [
          { head: 'Wavelength', unit: 'Å', decimals: 0 },
          { head: 'Old', decimals: yDecimals },
          { head: 'New', decimals: yDecimals },
        ],
        rows: [...new Set([...oldAt.keys(), ...nextAt.keys()])]
          .sort((a, b) => a - b)
          .map((x) => [x, oldAt.get(x) ?? null, nextAt.get(x) ?? null]),
      }}
    >
      <LineChart
        fluid
        height={240}
        labels="inside"
        label={`${title} against wavelength, ${isSame ? 'as saved' : 'old and new'}.`}
        series={series}
        xLabel="wavelength, Å"
        xName="λ"
        xDomain={[Math.min(...xs), Math.max(...xs)]}
        yDomain={yDomain}
        xDecimals={0}
        yDecimals={yDecimals}
      />
    </ChartFrame>
  )
}
