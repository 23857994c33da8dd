'use client'

import { useMemo } from 'react'
import { ChartFrame } from '@/components/charts/ChartFrame'
import type { LineSeries } from '@/components/charts/geometry/lineChart'
import { LineChart } from '@/components/charts/LineChart'
import type { TypedRow } from '@/lib/domain/facility/recordForm'
import type { TableKind } from '@/lib/domain/facility/rules'
import { bands } from '@/lib/science/light'
import { horizonAltitudeDeg } from '@/lib/science/sky'

interface Words {
  title: string
  file: string
  yDecimals: number
  x: { name: string; letter: string; unit: string; decimals: number }
}

const wavelength = { name: 'wavelength', letter: 'λ', unit: 'Å', decimals: 0 }

const words: Record<TableKind, Words> = {
  throughput: { title: 'Efficiency', file: 'efficiency', yDecimals: 3, x: wavelength },
  extinction: { title: 'Extinction, mag an airmass', file: 'extinction', yDecimals: 2, x: wavelength },
  'dark-sky': { title: 'Dark sky, AB mag arcsec⁻²', file: 'dark-sky', yDecimals: 2, x: wavelength },
  horizon: {
    title: 'Lowest altitude, degrees',
    file: 'horizon',
    yDecimals: 1,
    x: { name: 'azimuth, north through east', letter: 'azimuth', unit: 'degrees', decimals: 1 },
  },
}

const numberOr = (text: string) => (text.trim() === '' ? NaN : Number(text))

/** Rows that can be drawn, against wavelength or azimuth; bands stand at their middle. */
function pointsOf(rows: readonly TypedRow[], kind: TableKind): [number, number][] {
  const isBand = kind === 'extinction' || kind === 'dark-sky'
  return rows
    .map(({ at, value }): [number, number] => [
      isBand ? (bands[at.trim()]?.wavelengthA ?? NaN) : numberOr(at),
      numberOr(value),
    ])
    .filter(([x, y]) => (kind === 'horizon' ? x >= 0 && x < 360 : x > 0) && Number.isFinite(y))
    .sort(([a], [b]) => a - b)
}

/** The line through the points; a horizon goes on all around. */
function lineOf(points: [number, number][], kind: TableKind): [number, number][] {
  if (kind !== 'horizon' || points.length === 0) return points
  const rows = points.map(([azimuthDeg, altitudeDeg]) => ({ azimuthDeg, altitudeDeg }))
  const north = horizonAltitudeDeg(rows, 0)
  return [...(points[0]?.[0] === 0 ? [] : [[0, north] as [number, number]]), ...points, [360, north]]
}

export interface RecordTablePlotProps {
  kind: TableKind
  /** What the newest record says. */
  before: readonly TypedRow[]
  /** What is to be saved. */
  after: readonly TypedRow[]
}

/** The table as saved and as it would be, as lines over wavelength or azimuth, with both as numbers. */
export function RecordTablePlot({ kind, before, after }: RecordTablePlotProps) {
  const [old, next] = useMemo(
    () => [pointsOf(before, kind), pointsOf(after, kind)] as const,
    [before, after, kind],
  )
  const isSame = JSON.stringify(old) === JSON.stringify(next)
  const series = useMemo(() => {
    const lines: LineSeries[] = []
    const [before, after] = [lineOf(old, kind), lineOf(next, kind)]
    if (before.length > 1)
      lines.push({ id: 'old', name: isSame ? 'as saved' : 'old', tone: 's1', points: before })
    if (!isSame && after.length > 1)
      lines.push({
        id: 'new',
        name: before.length > 0 ? 'new' : 'as typed',
        tone: 's2',
        points: after,
        chosen: true,
      })
    return lines
  }, [old, next, isSame, kind])
  if (series.length === 0) return null
  const all = series.flatMap(({ points }) => points)
  const [xs, ys] = [all.map(([x]) => x), all.map(([, y]) => y)]
  const { title, file, yDecimals, x } = words[kind]
  const yDomain =
    kind === 'dark-sky'
      ? ([Math.floor(Math.min(...ys) - 0.5), Math.ceil(Math.max(...ys) + 0.01)] as const)
      : ([0, Math.max(...ys) * 1.15 || 1] as const)
  const values = (points: readonly (readonly [number, number])[]) => new Map(points)
  const [oldAt, nextAt] = [values(old), values(next)]
  const hasOld = old.length > 0
  const which = isSame ? 'as saved' : hasOld ? 'old and new' : 'as typed'
  return (
    <ChartFrame
      title={title}
      fileName={hasOld ? `${file}-old-and-new` : file}
      brief
      numbers={{
        caption: `${title}, ${hasOld ? 'old and new' : 'as typed'}`,
        columns: [
          { head: kind === 'horizon' ? 'Azimuth' : 'Wavelength', unit: x.unit, decimals: x.decimals },
          ...(hasOld ? [{ head: 'Old', decimals: yDecimals }] : []),
          { head: hasOld ? 'New' : 'Value', decimals: yDecimals },
        ],
        rows: [...new Set([...oldAt.keys(), ...nextAt.keys()])]
          .sort((a, b) => a - b)
          .map((at) => [at, ...(hasOld ? [oldAt.get(at) ?? null] : []), nextAt.get(at) ?? null]),
      }}
    >
      <LineChart
        fluid
        height={240}
        labels="inside"
        label={`${title} against ${kind === 'horizon' ? 'azimuth' : 'wavelength'}, ${which}.`}
        series={series}
        xLabel={`${x.name}, ${x.unit}`}
        xName={x.letter}
        xDomain={[Math.min(...xs), Math.max(...xs)]}
        yDomain={yDomain}
        xDecimals={x.decimals}
        yDecimals={yDecimals}
      />
    </ChartFrame>
  )
}
