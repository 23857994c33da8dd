import { ChartFrame } from '@/components/charts/ChartFrame'
import type { Pressure } from '@/lib/domain/figures/types'
import { formatNumber } from '@/lib/format'
import { PressureRow } from './PressureRow'
import { timesOver } from './timesOver'

interface PressureChartProps {
  title: string
  rows: readonly Pressure[]
  fileName: string
  /** What the classes are called in the table: `Half-month`. */
  classes: string
}

const hours = (seconds: number | null) => (seconds === null ? null : seconds / 3600)

/** Hours asked as bars against the hours on offer as ticks, a row a class. */
export function PressureChart({ title, rows, fileName, classes }: PressureChartProps) {
  const most = Math.max(1, ...rows.flatMap((row) => [row.askedSeconds, row.offeredSeconds ?? 0]))
  const asked = rows.reduce((sum, row) => sum + row.askedSeconds, 0) / 3600
  return (
    <ChartFrame
      brief
      title={title}
      fileName={fileName}
      numbers={{
        caption: `${title}: asked and on offer`,
        columns: [
          { head: classes },
          { head: 'Asked', unit: 'h', decimals: 1 },
          { head: 'On offer', unit: 'h', decimals: 1 },
          { head: 'Times over', decimals: 2 },
        ],
        rows: rows.map((row) => [
          row.name,
          hours(row.askedSeconds),
          hours(row.offeredSeconds),
          timesOver(row),
        ]),
      }}
    >
      <div
        role="img"
        aria-label={`${title}: ${formatNumber(asked, 1)} hours asked in ${rows.length} classes.`}
      >
        {rows.map((row) => (
          <PressureRow key={row.name} row={row} mostSeconds={most} />
        ))}
      </div>
    </ChartFrame>
  )
}
