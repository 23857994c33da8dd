import type { Pressure } from '@/lib/domain/figures/types'
import { formatNumber } from '@/lib/format'
import { timesOver } from './timesOver'

const hours = (seconds: number) => formatNumber(seconds / 3600, 1)

/** One class: what is asked as a bar, hollow beyond what is on offer, which is the tick; and both in hours. */
export function PressureRow({ row, mostSeconds }: { row: Pressure; mostSeconds: number }) {
  const share = (seconds: number) => `${(100 * seconds) / mostSeconds}%`
  const times = timesOver(row)
  const isOver = times !== null && times > 1
  return (
    <div
      aria-hidden="true"
      className="grid grid-cols-[8.5rem_1fr_11rem] items-center gap-x-4 py-1 text-table max-sm:grid-cols-[1fr_auto]"
    >
      <span className="truncate">{row.name}</span>
      <span className="relative block h-4 max-sm:order-last max-sm:col-span-2">
        <span
          className="absolute top-[3px] left-0 block h-2.5 border border-s1"
          style={{ width: share(row.askedSeconds) }}
        />
        <span
          className="absolute top-[3px] left-0 block h-2.5 bg-s1"
          style={{ width: share(Math.min(row.askedSeconds, row.offeredSeconds ?? row.askedSeconds)) }}
        />
        {row.offeredSeconds === null ? null : (
          <span
            className="absolute top-0 block h-4 w-[1.8px] bg-ink"
            style={{ left: share(row.offeredSeconds) }}
          />
        )}
      </span>
      <span className="text-right whitespace-nowrap">
        {hours(row.askedSeconds)}
        {row.offeredSeconds === null ? ' h' : ` of ${hours(row.offeredSeconds)} h`}
        <span className={isOver ? 'font-semibold' : 'text-muted'}>
          {times === null ? '' : `, ${formatNumber(times, 2)}×`}
        </span>
      </span>
    </div>
  )
}
