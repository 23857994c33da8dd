import { scaleLinear } from 'd3-scale'
import { formatHoursFromSeconds, formatNumber } from '@/lib/format'
import type { HoursHangOn } from '@/lib/domain/observations/rules'
import { HoursMark } from './HoursMark'

interface Row {
  name: string
  low: number | null
  high: number | null
  isSpan: boolean
  exponentOfSize?: number | null
}

function rowsOf(
  { own, cosmologies, errors }: HoursHangOn,
  ownName: string,
): { title: string; rows: Row[] }[] {
  const single = ({ name, seconds }: { name: string; seconds: number | null }): Row => ({
    name,
    low: seconds,
    high: seconds,
    isSpan: false,
  })
  const others = cosmologies.filter(({ name }) => name !== ownName)
  return [
    {
      title: others.length > 0 ? 'Under the current cosmologies' : 'As asked',
      rows: [single({ name: ownName, seconds: own.seconds }), ...others.map(single)],
    },
    { title: 'Within the errors of the target', rows: errors.map((span) => ({ ...span, isSpan: true })) },
  ].filter(({ rows }) => rows.length > 0)
}

function wordsOf({ low, high, isSpan }: Row): string {
  if (low === null) return 'not reached'
  if (!isSpan) return formatHoursFromSeconds(low)
  if (high === null) return `from ${formatHoursFromSeconds(low)}`
  return `${formatNumber(low / 3600, 1)} to ${formatHoursFromSeconds(high)}`
}

export interface HoursRowsProps {
  hangOn: HoursHangOn
  cosmologyName: string
  askedSeconds: number
}

/** Hours needed against the hours asked: a dot for each cosmology, a bar for each error; red past what is asked. */
export function HoursRows({ hangOn, cosmologyName, askedSeconds }: HoursRowsProps) {
  const groups = rowsOf(hangOn, cosmologyName)
  const all = groups.flatMap(({ rows }) => rows.flatMap(({ low, high }) => [low ?? 0, high ?? 0]))
  const scale = scaleLinear()
    .domain([0, Math.max(askedSeconds * 1.25, ...all) / 3600])
    .nice(5)
  const share = (seconds: number) => 100 * scale.range([0, 1])(seconds / 3600)
  return (
    <div>
      <p className="m-0 mb-2 text-caption font-semibold">
        Hours needed with overheads; the line stands at the {formatHoursFromSeconds(askedSeconds)} asked
      </p>
      {groups.map(({ title, rows }) => (
        <div key={title} className="border-t border-rule py-2">
          <p className="m-0 mb-1 text-tick text-muted">{title}</p>
          {rows.map((row) => (
            <div key={row.name} className="flex items-center gap-x-4 text-caption">
              <span className="w-40 shrink-0 max-sm:w-28">
                {row.name}
                {row.exponentOfSize ? (
                  <span className="block text-tick text-muted">
                    open time as size<sup>{formatNumber(row.exponentOfSize, 1)}</sup>
                  </span>
                ) : null}
              </span>
              <HoursMark
                low={row.low === null ? null : share(row.low)}
                high={row.high === null ? null : share(row.high)}
                asked={share(askedSeconds)}
                isSpan={row.isSpan}
                isOver={row.high === null || row.high > askedSeconds}
              />
              <span
                className={
                  row.high === null || row.high > askedSeconds
                    ? 'w-24 shrink-0 text-right font-semibold text-not-feasible'
                    : 'w-24 shrink-0 text-right'
                }
              >
                {wordsOf(row)}
              </span>
            </div>
          ))}
        </div>
      ))}
      <div className="flex gap-x-4 border-t border-ink pt-1 text-tick text-muted" aria-hidden="true">
        <span className="w-40 shrink-0 max-sm:w-28">hours</span>
        <span className="relative h-4 min-w-0 flex-1">
          {scale.ticks(5).map((tick) => (
            <span key={tick} className="absolute -translate-x-1/2" style={{ left: `${share(tick * 3600)}%` }}>
              {formatNumber(tick, tick % 1 === 0 ? 0 : 1)}
            </span>
          ))}
        </span>
        <span className="w-24 shrink-0" />
      </div>
    </div>
  )
}
