import { ABSENT, formatHoursFromSeconds, formatPercent } from '@/lib/format'
import type { HoursHangOn } from '@/lib/domain/observations/rules'

interface Row {
  name: string
  low: number | null
  high: number | null
}

function rowsOf({ cosmologies, errors, conditions }: HoursHangOn): { title: string; rows: Row[] }[] {
  const single = ({ name, seconds }: { name: string; seconds: number | null }): Row => ({
    name,
    low: seconds,
    high: seconds,
  })
  return [
    { title: 'Under the current cosmologies', rows: cosmologies.map(single) },
    {
      title: 'Within the errors of the target',
      rows: errors.map(({ name, low, high }) => ({ name, low: low.seconds, high: high.seconds })),
    },
    { title: 'By the image the night delivers', rows: conditions.map(single) },
  ].filter(({ rows }) => rows.length > 0)
}

const width = 300

/** Hours needed as bars against the hours asked; what goes past them is red. */
export function HoursRows({ hangOn, askedSeconds }: { hangOn: HoursHangOn; askedSeconds: number }) {
  const groups = rowsOf(hangOn)
  const all = groups.flatMap(({ rows }) => rows.flatMap(({ low, high }) => [low ?? 0, high ?? 0]))
  const most = Math.max(askedSeconds * 1.25, ...all)
  const x = (seconds: number) => Math.round((width * seconds * 10) / most) / 10
  return (
    <div>
      <p className="m-0 mb-2 text-caption font-semibold">
        Hours needed, asked {formatHoursFromSeconds(askedSeconds)}
      </p>
      {groups.map(({ title, rows }) => (
        <div key={title} className="border-t border-rule py-2">
          <p className="m-0 text-tick text-muted">{title}</p>
          {rows.map(({ name, low, high }) => {
            const isOver = high === null || high > askedSeconds
            const words =
              low === null || high === null
                ? 'not reached'
                : low === high
                  ? formatHoursFromSeconds(high)
                  : `${formatHoursFromSeconds(low)} to ${formatHoursFromSeconds(high)}`
            return (
              <div key={name} className="flex flex-wrap items-center gap-x-4 text-caption">
                <span className="w-44 shrink-0">{name}</span>
                <svg
                  viewBox={`0 0 ${width} 24`}
                  className="h-6 min-w-0 flex-1 basis-40"
                  preserveAspectRatio="none"
                  role="img"
                  aria-label={`${words}, ${askedSeconds > 0 && high !== null ? formatPercent(high / askedSeconds, 0) : ABSENT} of asked`}
                >
                  <path d={`M0 12H${width}`} stroke="var(--grid)" />
                  {low !== null && high !== null ? (
                    <rect
                      x={low === high ? 0 : x(low)}
                      y="8"
                      width={Math.max(2, low === high ? x(high) : x(high) - x(low))}
                      height="8"
                      fill={isOver ? 'var(--not-feasible)' : 'var(--s1)'}
                    />
                  ) : null}
                  <rect x={x(askedSeconds) - 0.8} y="0" width="1.6" height="24" fill="var(--ink)" />
                </svg>
                <span
                  className={isOver ? 'w-28 text-right font-semibold text-not-feasible' : 'w-28 text-right'}
                >
                  {words}
                </span>
              </div>
            )
          })}
        </div>
      ))}
    </div>
  )
}
