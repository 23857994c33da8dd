import { AskedBar } from '@/components/charts/AskedBar'
import { TableFrame } from '@/components/tables/TableFrame'
import { VerdictMark } from '@/components/ui/VerdictMark'
import type { TargetHours } from '@/lib/domain/assessments/rules'
import { countInWords, formatHoursFromSeconds, formatNumber } from '@/lib/format'

const hours = (seconds: number, decimals = 2) => formatNumber(seconds / 3600, decimals)
const heads = [
  ['Open', 'h'],
  ['Overheads', 'h'],
  ['Computed', 'h'],
  ['Asked', 'h'],
] as const

export interface HoursTableProps {
  targets: readonly TargetHours[]
  /** The hours the standing assessment calls true; bars are drawn in its proportion. */
  trueSeconds: number | null
}

/** Hours of each target against the hours asked: the bar, and the asked hours as its limit. */
export function HoursTable({ targets, trueSeconds }: HoursTableProps) {
  const total = (of: (row: TargetHours) => number) => targets.reduce((sum, row) => sum + of(row), 0)
  const needed = total((row) => row.neededSeconds)
  const asked = total((row) => row.askedSeconds)
  const said = trueSeconds ?? needed
  const share = needed > 0 ? said / needed : 1
  const most =
    Math.max(0.1, ...targets.map((row) => Math.max(row.askedSeconds, row.neededSeconds * share))) / 3600
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
          {targets.map((row) => (
            <tr key={row.targetId}>
              <th scope="row">
                {row.name}
                <span className="block text-caption font-normal text-muted">
                  {row.modes.join(', ')}
                  {row.need === 'required' ? '' : `, ${row.need}`}
                </span>
              </th>
              <td className="is-right">{hours(row.openSeconds)}</td>
              <td className="is-right">{hours(row.overheadSeconds)}</td>
              <td className="is-right is-computed">{hours(row.neededSeconds)}</td>
              <td className="is-right">{hours(row.askedSeconds)}</td>
              <td>
                <AskedBar
                  trueHours={(row.neededSeconds * share) / 3600}
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
            <td>{countInWords(targets.length, 'target')}</td>
            <td className="is-right">{hours(total((row) => row.openSeconds))}</td>
            <td className="is-right">{hours(total((row) => row.overheadSeconds))}</td>
            <td className="is-right is-computed">{hours(needed)}</td>
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
        Bar: {trueSeconds === null ? 'computed hours' : 'true hours, shared as computed'}. Dashed line:
        computed. Tick: asked, the limit.
      </p>
    </div>
  )
}
