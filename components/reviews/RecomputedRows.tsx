import { VerdictMark } from '@/components/ui/VerdictMark'
import type { Recomputation } from '@/lib/domain/reviews/recomputationSchema'
import { ABSENT, countInWords, formatNumber, formatSigned } from '@/lib/format'

export interface RecomputedRowsProps {
  stated: Recomputation['stated']
  again: Recomputation | null
  isComputing: boolean
}

const hours = (seconds: number) => formatNumber(seconds / 3600, 1)

function flipWords({ flips }: Recomputation): string {
  return flips === 0 ? 'none flips' : countInWords(flips, 'flips', 'flip')
}

/** Hours needed and verdict side by side, with what changes. */
export function RecomputedRows({ stated, again, isComputing }: RecomputedRowsProps) {
  const waiting = isComputing ? 'computing …' : ABSENT
  return (
    <table className="data-table">
      <caption className="sr-only">Hours and verdict as stated and under the chosen cosmology</caption>
      <thead>
        <tr>
          <th scope="col">All targets</th>
          <th scope="col" className="is-right">
            as stated
          </th>
          <th scope="col" className="is-right">
            {again?.cosmologyName ?? 'another'}
          </th>
          <th scope="col" className="is-right">
            change
          </th>
        </tr>
      </thead>
      <tbody>
        <tr>
          <th scope="row" className="font-normal">
            Hours needed
          </th>
          <td className="is-right">{hours(stated.neededSeconds)}</td>
          <td className="is-right font-semibold">{again ? hours(again.neededSeconds) : waiting}</td>
          <td className="is-right text-muted">
            {again ? `${formatSigned((again.neededSeconds - stated.neededSeconds) / 3600, 1)} h` : ABSENT}
          </td>
        </tr>
        <tr>
          <th scope="row" className="font-normal">
            Verdict
          </th>
          <td className="is-right">{stated.verdict ? <VerdictMark verdict={stated.verdict} /> : ABSENT}</td>
          <td className="is-right">{again?.verdict ? <VerdictMark verdict={again.verdict} /> : waiting}</td>
          <td className="is-right text-muted">{again ? flipWords(again) : ABSENT}</td>
        </tr>
      </tbody>
    </table>
  )
}
