import type { NightsView } from '@/lib/domain/decisions/nightsView'
import { formatHoursFromSeconds, formatNumber } from '@/lib/format'
import { SeasonCells } from './SeasonCells'

/** Hours on offer on one telescope, what is given of them, and where the suggestion lays them. */
export function OfferedHours({
  telescope,
  seasonFrom,
}: {
  telescope: NightsView['telescopes'][number]
  seasonFrom: string
}) {
  const { name, offeredSeconds, givenSeconds } = telescope
  const left = offeredSeconds - givenSeconds
  return (
    <section aria-label={`Hours on offer on ${name}`} className="min-w-0">
      <div className="flex flex-wrap items-baseline justify-between gap-x-6 pt-3 rule-open">
        <h2 className="text-body font-semibold">{name}</h2>
        <p className="m-0 text-table">
          <strong>{formatNumber(givenSeconds / 3600, 1)}</strong> given of{' '}
          {formatHoursFromSeconds(offeredSeconds)}, <strong>{formatHoursFromSeconds(left)}</strong> left
        </p>
      </div>
      <div className="mt-2 h-2 w-full bg-rule" aria-hidden="true">
        <div
          className="h-full bg-accent transition-[width] duration-move"
          style={{
            width: `${offeredSeconds > 0 ? Math.min(100, (100 * givenSeconds) / offeredSeconds) : 0}%`,
          }}
        />
      </div>
      <div className="mt-3">
        <SeasonCells telescope={telescope} seasonFrom={seasonFrom} />
      </div>
    </section>
  )
}
