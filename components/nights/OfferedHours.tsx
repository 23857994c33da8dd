import type { NightsView } from '@/lib/domain/decisions/readNights'
import { formatHoursFromSeconds, formatNumber } from '@/lib/format'

const months = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec']
const monthName = (month: string) => months[Number(month.slice(5)) - 1] ?? month
const height = 72

/** Hours on offer on one telescope by half-month, and what is given of them. */
export function OfferedHours({ telescope }: { telescope: NightsView['telescopes'][number] }) {
  const { name, halves, offeredSeconds, givenSeconds } = telescope
  const most = Math.max(1, ...halves.map((half) => half.seconds))
  const step = 44
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
      <div className="mt-3 overflow-x-auto">
        <svg
          role="img"
          aria-label={halves
            .map(
              (half) =>
                `${half.half === 1 ? 'first' : 'second'} half of ${monthName(half.month)} ${formatNumber(half.seconds / 3600, 1)} h`,
            )
            .join(', ')}
          width={Math.max(1, halves.length) * step}
          height={height + 36}
          className="block"
        >
          {halves.map((half, index) => {
            const tall = (half.seconds / most) * (height - 16)
            return (
              <g key={`${half.month}-${half.half}`} transform={`translate(${index * step} 0)`}>
                <rect
                  x="2"
                  y={height - tall}
                  width={step - 6}
                  height={tall}
                  fill="var(--s1)"
                  opacity="0.28"
                />
                <text
                  x={step / 2 - 1}
                  y={height - tall - 4}
                  textAnchor="middle"
                  fontSize="11"
                  fill="var(--ink)"
                >
                  {formatNumber(half.seconds / 3600, 1)}
                </text>
                {half.half === 1 || index === 0 ? (
                  <text x="2" y={height + 16} fontSize="12" fill="var(--ink-muted)">
                    {monthName(half.month)}
                  </text>
                ) : null}
              </g>
            )
          })}
          <path d={`M0 ${height + 0.5}H${halves.length * step}`} stroke="var(--ink)" />
        </svg>
      </div>
      <p className="m-0 text-caption text-muted">Dark hours for science, by half-month.</p>
    </section>
  )
}
