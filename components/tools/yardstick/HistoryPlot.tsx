'use client'

import { useMemo } from 'react'
import { ChartFrame } from '@/components/charts/ChartFrame'
import { LineChart } from '@/components/charts/LineChart'
import { historiesOf } from '@/lib/domain/tools/yardstick/histories'
import type { ReadyUniverse } from '@/lib/domain/tools/yardstick/universes'
import { toneOf } from './toneOf'

const now = [{ x: 0, words: 'now' }]
const title = 'Size of the universe a(t), now = 1'

/** How each universe has grown and will: past at the left, now in lamp. */
export function HistoryPlot({ universes, height }: { universes: readonly ReadyUniverse[]; height: number }) {
  const { histories, domain, largest } = useMemo(() => historiesOf(universes), [universes])
  const yDomain = useMemo(() => [0, largest] as const, [largest])
  const series = useMemo(
    () =>
      histories
        .filter(({ points }) => points.length > 1)
        .map(({ place, name, points, event }) => ({
          id: String(place),
          name: event ?? name,
          tone: toneOf(place),
          points,
          chosen: place === 0,
        })),
    [histories],
  )
  const events = histories.flatMap(({ name, event }) => (event ? [`${name} ${event}.`] : []))
  return (
    <ChartFrame
      brief
      title={title}
      fileName="yardstick-history"
      numbers={{
        caption: title,
        columns: [
          { head: 'Cosmology' },
          { head: 'Time', unit: 'Gyr from now', decimals: 3 },
          { head: 'Size', unit: 'now = 1', decimals: 4 },
        ],
        rows: histories.flatMap(({ name, points }) => points.map(([time, size]) => [name, time, size])),
      }}
    >
      <LineChart
        label={`Size of each universe against time, now = 1. ${events.join(' ')}`}
        xLabel="Gyr from now"
        xName="t"
        xDomain={domain}
        yDomain={yDomain}
        xDecimals={1}
        yDecimals={3}
        labels="inside"
        fluid
        height={height}
        uprights={now}
        series={series}
      />
    </ChartFrame>
  )
}
