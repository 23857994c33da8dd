'use client'

import { ChartFrame } from '@/components/charts/ChartFrame'
import { LineChart } from '@/components/charts/LineChart'
import type { SeriesTone } from '@/components/charts/geometry/chartTypes'
import type { Arrivals } from '@/lib/domain/figures/types'

const tones: SeriesTone[] = ['s1', 's2', 's3', 's4']

/** How the proposals of this call came in, against the calls before it. */
export function ArrivalsChart({ arrivals, fileName }: { arrivals: Arrivals[]; fileName: string }) {
  const shown = arrivals.filter(({ points }) => points.length > 0)
  const most = Math.max(4, ...shown.flatMap(({ points }) => points.map(([, count]) => count)))
  const first = Math.min(-1, ...shown.flatMap(({ points }) => points.map(([days]) => days)))
  return (
    <ChartFrame
      title="Proposals arrived"
      fileName={fileName}
      numbers={{
        caption: 'Proposals arrived, by days before the deadline',
        columns: [
          { head: 'Call' },
          { head: 'Before the deadline', unit: 'days', decimals: 3 },
          { head: 'Arrived', decimals: 0 },
        ],
        rows: shown.flatMap(({ callNumber, points }) =>
          points.map(([days, count]) => [`Call ${callNumber}`, -days, count]),
        ),
      }}
    >
      <LineChart
        fluid
        label={`Proposals arrived against days to the deadline, for ${shown.map(({ callNumber }) => `call ${callNumber}`).join(', ')}.`}
        series={shown.map(({ callNumber, points }, index) => ({
          id: String(callNumber),
          name: `Call ${callNumber}`,
          tone: tones[index] ?? 's4',
          points,
          chosen: index === 0,
        }))}
        xLabel="days to the deadline"
        xName="days"
        xDomain={[first, 0]}
        yDomain={[0, most]}
        xDecimals={1}
        yDecimals={0}
        height={280}
      />
    </ChartFrame>
  )
}
