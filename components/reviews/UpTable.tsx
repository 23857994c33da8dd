import { MonthSparkline } from '@/components/charts/MonthSparkline'
import { TableFrame } from '@/components/tables/TableFrame'
import type { AnonymousProposal } from '@/lib/domain/packets/anonymise'
import { formatNumber } from '@/lib/format'

const monthName = (month: string) =>
  new Date(`${month}-15T00:00:00Z`).toLocaleString('en-GB', { month: 'short', timeZone: 'UTC' })

/** Dark hours each target is up in the season, month by month, above the airmass asked for. */
export function UpTable({ proposal }: { proposal: AnonymousProposal }) {
  const rows = proposal.computation.targets
  const names = new Map(proposal.targets.map(({ id, name }) => [id, name]))
  const months = rows[0]?.visibleHoursByMonth.map(({ month }) => month) ?? []
  const most = Math.max(1, ...rows.flatMap((row) => row.visibleHoursByMonth.map(({ hours }) => hours)))
  return (
    <TableFrame caption="Dark hours up in the season" phone="scroll">
      <thead>
        <tr>
          <th scope="col">Target</th>
          <th scope="col">Through the season</th>
          {months.map((month) => (
            <th key={month} scope="col" className="is-right">
              {monthName(month)}
              <span className="unit">h</span>
            </th>
          ))}
          <th scope="col" className="is-right">
            Season
            <span className="unit">h</span>
          </th>
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <tr key={row.targetId}>
            <th scope="row">{names.get(row.targetId)}</th>
            <td>
              <MonthSparkline
                months={row.visibleHoursByMonth.map(({ month, hours }) => ({
                  month: monthName(month),
                  sum: hours,
                }))}
                max={most}
              />
            </td>
            {row.visibleHoursByMonth.map(({ month, hours }) => (
              <td key={month} className="is-right">
                {formatNumber(hours, 0)}
              </td>
            ))}
            <td className="is-right font-semibold">{formatNumber(row.visibleHours, 0)}</td>
          </tr>
        ))}
      </tbody>
    </TableFrame>
  )
}
