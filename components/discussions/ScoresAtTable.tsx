import type { TableView } from '@/lib/domain/discussions/tableView'
import { ABSENT, formatNumber, formatSigned } from '@/lib/format'

/** First and later scores by the reviewer's number, with the means; the first stand unchanged. */
export function ScoresAtTable({ view }: { view: TableView }) {
  const { scores, meanBefore, meanAfter } = view
  if (scores.length === 0) return <p className="m-0 text-table text-muted">No review of it was finished.</p>
  const number = (value: number | null) => (value === null ? ABSENT : formatNumber(value, 2))
  return (
    <table className="w-full max-w-md text-table tabular-nums">
      <caption className="sr-only">Scores before and in the discussion</caption>
      <thead>
        <tr className="border-y border-t-2 border-edge border-t-ink text-left">
          <th scope="col" className="py-2 font-semibold">
            Reviewer
          </th>
          <th scope="col" className="py-2 text-right font-semibold">
            First
          </th>
          <th scope="col" className="py-2 text-right font-semibold">
            Now
          </th>
          <th scope="col" className="py-2 text-right font-semibold">
            Shift
          </th>
        </tr>
      </thead>
      <tbody>
        {scores.map(({ reviewer, before, after }) => (
          <tr key={reviewer} className="border-b border-rule">
            <th scope="row" className="py-2 text-left font-normal">
              {reviewer}
            </th>
            <td className="py-2 text-right">{number(before)}</td>
            <td className="py-2 text-right font-semibold">{number(after)}</td>
            <td className="py-2 text-right text-muted">
              {before === null || after === null ? '' : formatSigned(after - before, 2)}
            </td>
          </tr>
        ))}
      </tbody>
      <tfoot>
        <tr className="font-semibold rule-total">
          <th scope="row" className="py-2 text-left">
            Mean
          </th>
          <td className="py-2 text-right">{number(meanBefore)}</td>
          <td className="py-2 text-right">{number(meanAfter)}</td>
          <td className="py-2 text-right">
            {meanBefore === null || meanAfter === null ? '' : formatSigned(meanAfter - meanBefore, 2)}
          </td>
        </tr>
      </tfoot>
    </table>
  )
}
