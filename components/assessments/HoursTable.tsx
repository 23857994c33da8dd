import { AskedBar } from '@/components/charts/AskedBar'
import { TableFrame } from '@/components/tables/TableFrame'
import { VerdictMark } from '@/components/ui/VerdictMark'
import { countedSeconds, trueSecondsByTarget, type TargetHours } from '@/lib/domain/assessments/rules'
import { ABSENT, formatHoursFromSeconds, formatNumber } from '@/lib/format'

const hours = (seconds: number, decimals = 2) => formatNumber(seconds / 3600, decimals)
const heads = [
  ['Open', 'h'],
  ['Overheads', 'h'],
  ['Computed', 'h'],
  ['True', 'h'],
  ['Asked', 'h'],
] as const

/** What is not plain about how a target counts: ', backup, not counted', ', 3 triggers'. */
function standingWords({ need, times }: TargetHours): string {
  if (times === 0) return need === 'backup' ? ', backup, not counted' : ', not counted'
  const needed = need === 'optional' ? ', optional' : ''
  return times === 1 ? needed : `${needed}, ${times} triggers together`
}

export interface HoursTableProps {
  targets: readonly TargetHours[]
  /** The hours the standing assessment calls true; null before there is one. */
  trueSeconds: number | null
}

/** Hours of each target against the hours asked: the bar, and the asked hours as its limit. */
export function HoursTable({ targets, trueSeconds }: HoursTableProps) {
  const needed = countedSeconds(targets, 'neededSeconds')
  const asked = countedSeconds(targets, 'askedSeconds')
  const said = trueSeconds ?? needed
  const shares = trueSecondsByTarget(targets, said)
  const longest = Math.max(360, ...shares, ...targets.map((row) => row.askedSeconds))
  const most = longest / 3600
  const spare = asked - said
  return (
    <div>
      <TableFrame caption="Hours of each target" phone="scroll">
        <thead>
          <tr>
            <th scope="col">Target</th>
            {heads.map(([head, unit]) => (
              <th key={head} scope="col" className="is-right">
                {head}
                <span className="unit">{unit}</span>
              </th>
            ))}
            <th scope="col">{trueSeconds === null ? 'Computed' : 'True'} hours against the asked</th>
          </tr>
        </thead>
        <tbody>
          {targets.map((row, index) => (
            <tr key={row.targetId}>
              <th scope="row">
                {row.name}
                <span className="block text-caption font-normal text-muted">
                  {row.modes.join(', ')}
                  {standingWords(row)}
                </span>
              </th>
              <td className="is-right">{hours(row.openSeconds)}</td>
              <td className="is-right">{hours(row.overheadSeconds)}</td>
              <td className="is-right is-computed">{hours(row.neededSeconds)}</td>
              <td className="is-right font-semibold">
                {trueSeconds === null || row.times === 0 ? ABSENT : hours(shares[index] ?? 0)}
              </td>
              <td className="is-right">{hours(row.askedSeconds)}</td>
              <td>
                <AskedBar
                  trueHours={(shares[index] ?? 0) / 3600}
                  computedHours={row.neededSeconds / 3600}
                  askedHours={row.askedSeconds / 3600}
                  maxHours={most}
                />
              </td>
            </tr>
          ))}
        </tbody>
        <tfoot>
          <tr>
            <td>{targets.length === 1 ? '1 target' : `${targets.length} targets`}</td>
            <td className="is-right">{hours(countedSeconds(targets, 'openSeconds'))}</td>
            <td className="is-right">{hours(countedSeconds(targets, 'overheadSeconds'))}</td>
            <td className="is-right is-computed">{hours(needed)}</td>
            <td className="is-right">{trueSeconds === null ? ABSENT : hours(trueSeconds)}</td>
            <td className="is-right">{hours(asked)}</td>
            <td>
              <VerdictMark
                verdict={spare >= 0 ? 'feasible' : 'not-feasible'}
                words={
                  spare >= 0
                    ? `${formatHoursFromSeconds(spare)} to spare`
                    : `${formatHoursFromSeconds(-spare)} more than asked`
                }
              />
            </td>
          </tr>
        </tfoot>
      </TableFrame>
      <p className="mt-2 text-caption text-muted">
        Bar:{' '}
        {trueSeconds === null
          ? 'computed hours'
          : 'true hours, with what differs from the computed shared over the overheads'}
        . Dashed line: computed. Tick: asked, the limit.
      </p>
    </div>
  )
}
