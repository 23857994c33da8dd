import type { NightsView } from '@/lib/domain/decisions/nightsView'
import { formatNumber } from '@/lib/format'

const months = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec']
const monthName = (month: string) => months[Number(month.slice(5)) - 1] ?? month
const height = 72

/** Hours on offer by half-month, a column each; as wide as there is room. */
export function HalfMonths({ halves }: Pick<NightsView['telescopes'][number], 'halves'>) {
  const most = Math.max(1, ...halves.map((half) => half.seconds))
  const step = 100 / Math.max(1, halves.length)
  const words = halves.map(
    ({ half, month, seconds }) =>
      `${half === 1 ? 'first' : 'second'} half of ${monthName(month)} ${formatNumber(seconds / 3600, 1)} h`,
  )
  return (
    <svg role="img" aria-label={words.join(', ')} width="100%" height={height + 24} className="block">
      {halves.map(({ half, month, seconds }, index) => {
        const tall = (seconds / most) * (height - 16)
        return (
          <g key={`${month}-${half}`} fontSize="11" fill="var(--ink)">
            <rect
              x={`${(index + 0.05) * step}%`}
              y={height - tall}
              width={`${0.9 * step}%`}
              height={tall}
              fill="var(--s1)"
              opacity="0.28"
            />
            <text x={`${(index + 0.5) * step}%`} y={height - tall - 4} textAnchor="middle">
              {formatNumber(seconds / 3600, 1)}
            </text>
            {month !== halves[index - 1]?.month ? (
              <text x={`${(index + 0.05) * step}%`} y={height + 16} fontSize="12" fill="var(--ink-muted)">
                {monthName(month)}
              </text>
            ) : null}
          </g>
        )
      })}
      <path d={`M0 ${height + 0.5}H10000`} stroke="var(--ink)" />
    </svg>
  )
}
