import { useId } from 'react'
import { classNames } from '@/components/ui/classNames'
import { seasonHours, type SeasonMonth } from './geometry/season'
import { hourLabels } from './geometry/seasonLabels'
import { SeasonNights } from './SeasonNights'
import { SeasonNotes } from './SeasonNotes'
import type { SeasonChartProps } from './seasonTypes'

/** A month cut short by the season's edge has room for less of its name, or for none. */
const monthName = ({ name, count }: SeasonMonth) =>
  count >= 14 ? name : count >= 6 ? name.slice(0, 3) : '\u00a0'

const height = 312
const width = 1176

/** Nights across, hours up: site time at the left, UTC at the right. */
export function SeasonChartWide({ picture, moons, target, notes = [], monthValues }: SeasonChartProps) {
  const id = useId()
  const nights = picture.columns.length
  const along = (night: number) => `${((night / nights) * 100).toFixed(2)}%`
  const up = (hour: number) =>
    height - ((hour - seasonHours.from) / (seasonHours.to - seasonHours.from)) * height
  const hours = hourLabels(picture.utcOffsetHours, 2)
  return (
    <div className="grid grid-cols-[60px_minmax(0,1fr)_60px] text-tick text-muted">
      <span>hour</span>
      <div className="relative h-6">
        {moons.map((moon) => (
          <span
            key={`${moon.kind} ${moon.night}`}
            className={classNames(
              'absolute -translate-x-1/2 whitespace-nowrap',
              moon.kind === 'full' && 'font-semibold text-ink',
            )}
            style={{ left: along(moon.night + 0.5) }}
          >
            {moon.kind} {moon.day}
            <span className="absolute top-[18px] left-1/2 h-1.5 w-px bg-muted" />
          </span>
        ))}
      </div>
      <span className="text-right">UTC</span>
      <div className="relative">
        {hours.map(({ hour, local }) => (
          <span key={hour} className="absolute right-3 -translate-y-1/2" style={{ top: up(hour) }}>
            {local}
            <span className="absolute top-1/2 -right-3 h-px w-1.5 bg-muted" />
          </span>
        ))}
      </div>
      <div className="relative">
        <SeasonNights
          id={id}
          columns={picture.columns}
          months={picture.months}
          target={target}
          width={width}
          height={height}
        />
        <SeasonNotes notes={notes} place={({ night, hour }) => ({ left: along(night), top: up(hour) })} />
      </div>
      <div className="relative">
        {hours.map(({ hour, utc }) => (
          <span key={hour} className="absolute left-3 -translate-y-1/2" style={{ top: up(hour) }}>
            {utc}
            <span className="absolute top-1/2 -left-3 h-px w-1.5 bg-muted" />
          </span>
        ))}
      </div>
      <div className="col-start-2 flex border-t border-ink">
        {picture.months.map((month, index) => (
          <div
            key={month.name}
            className="min-w-0 text-center text-ink"
            style={{ flex: `${month.count} 0 0` }}
          >
            <div className="flex h-1.5 justify-between">
              <span className="w-px bg-ink" />
              {index === picture.months.length - 1 ? <span className="w-px bg-ink" /> : null}
            </div>
            <div className="truncate text-caption font-medium">{monthName(month)}</div>
            {monthValues ? <div className="truncate pt-1">{monthValues[index]}</div> : null}
          </div>
        ))}
      </div>
    </div>
  )
}
