import { formatHours } from '@/lib/format'
import { upBar } from './geometry/upBar'

export interface UpBarsRow {
  name: string
  byNight: readonly number[]
  totalHours: number
  tone?: 'marginal' | 'not-feasible'
}

export interface UpBarsProps {
  rows: readonly UpBarsRow[]
  months: readonly { count: number; name: string }[]
  /** The height of a row, in hours; without it the longest night of any row. */
  maxHours?: number
  label: string
}

/** Name, line, sum; on phones the line has the whole width under the two words. */
const rowGrid = 'grid grid-cols-2 items-end gap-x-3 sm:grid-cols-[7rem_minmax(0,1fr)_5rem]'

const height = 26
const width = 500

/** When targets are up: hours a night, a row each, with their sum. */
export function UpBars({ rows, months, maxHours, label }: UpBarsProps) {
  const most = maxHours ?? Math.max(1, ...rows.flatMap(({ byNight }) => byNight))
  return (
    <figure className="m-0" role="img" aria-label={label}>
      <div aria-hidden="true" className="flex flex-col gap-y-1.5 text-caption">
        {rows.map((row) => {
          const colour = row.tone ? `var(--${row.tone})` : 'var(--s1)'
          const shape = upBar(row.byNight, width, height, most)
          return (
            <div key={row.name} className={rowGrid}>
              <span className="truncate sm:text-right">{row.name}</span>
              <svg
                viewBox={`0 0 ${width} ${height}`}
                width="100%"
                height={height}
                preserveAspectRatio="none"
                className="block overflow-visible max-sm:order-last max-sm:col-span-2"
              >
                <path d={shape.area} fill={colour} opacity="0.16" />
                <path
                  d={shape.line}
                  fill="none"
                  stroke={colour}
                  strokeWidth="1.6"
                  vectorEffect="non-scaling-stroke"
                />
              </svg>
              <span className="text-right">{formatHours(row.totalHours)}</span>
            </div>
          )
        })}
        <div className={rowGrid}>
          <div className="flex border-t border-ink text-tick text-muted max-sm:col-span-2 sm:col-start-2">
            {months.map((month) => (
              <div
                key={month.name}
                className="min-w-0 overflow-hidden text-center"
                style={{ flex: `${month.count} 0 0` }}
              >
                <span className="block h-1.5 w-px bg-ink" />
                <span className="max-sm:hidden">{month.name}</span>
                <span className="sm:hidden">{month.name.slice(0, 3)}</span>
              </div>
            ))}
          </div>
        </div>
      </div>
    </figure>
  )
}
