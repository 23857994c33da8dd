import { useId } from 'react'
import { classNames } from '@/components/ui/classNames'
import { seasonHours } from './geometry/season'
import { hourLabels } from './geometry/seasonLabels'
import { SeasonNights } from './SeasonNights'
import type { SeasonChartProps } from './seasonTypes'

const width = 288
const height = 560

/** Nights down, hours across: months at the left, new and full Moons at the right. */
export function SeasonChartTurned({ picture, moons, target, monthValues }: SeasonChartProps) {
  const id = useId()
  const nights = picture.columns.length
  const down = (night: number) => (night / nights) * height
  const across = (hour: number) =>
    `${(((hour - seasonHours.from) / (seasonHours.to - seasonHours.from)) * 100).toFixed(2)}%`
  return (
    <div className="grid grid-cols-[44px_minmax(0,1fr)_36px] text-tick text-muted">
      <span />
      <div className="relative h-6 border-b border-ink">
        {hourLabels(picture.utcOffsetHours, 3).map(({ hour, local }) => (
          <span key={hour} className="absolute -translate-x-1/2" style={{ left: across(hour) }}>
            {local}
          </span>
        ))}
      </div>
      <span />
      <div className="relative border-r border-ink" style={{ height }}>
        {picture.months.map((month, index) => (
          <span
            key={month.name}
            className="absolute right-2 -translate-y-1/2 text-right text-caption font-medium text-ink"
            style={{ top: down(month.first + month.count / 2) }}
          >
            {month.count >= 6 ? month.name.slice(0, 3) : ''}
            {monthValues ? (
              <span className="block text-tick font-normal text-muted">{monthValues[index]}</span>
            ) : null}
          </span>
        ))}
      </div>
      <SeasonNights
        id={id}
        columns={picture.columns}
        months={picture.months}
        target={target}
        width={width}
        height={height}
        turned
      />
      <div className="relative">
        {moons.map((moon) => (
          <span
            key={`${moon.kind} ${moon.night}`}
            className={classNames(
              'absolute left-1.5 -translate-y-1/2',
              moon.kind === 'full' && 'font-semibold text-ink',
            )}
            style={{ top: down(moon.night + 0.5) }}
          >
            {moon.kind}
          </span>
        ))}
      </div>
    </div>
  )
}
