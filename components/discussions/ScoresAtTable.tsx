import { saveText } from '@/components/tables/saveText'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import type { TableView } from '@/lib/domain/discussions/tableView'
import { ABSENT, csvText, formatNumber, formatSigned, type CsvValue } from '@/lib/format'

const rounded = (value: number | null): CsvValue => (value === null ? '' : Number(value.toFixed(4)))
const shift = (before: number | null, after: number | null) =>
  before === null || after === null ? null : after - before

/** The table as a file: the same rows, the means last, every number as it is. */
function save({ callNumber, proposal, scores, meanBefore, meanAfter }: TableView): void {
  const line = (head: CsvValue, before: number | null, after: number | null) => [
    head,
    ...[before, after, shift(before, after)].map(rounded),
  ]
  saveText(
    `scores-${proposal?.reviewNumber ?? callNumber}.csv`,
    csvText(
      ['Reviewer', 'First', 'Now', 'Shift'],
      [
        ...scores.map(({ reviewer, before, after }) => line(reviewer, before, after)),
        line('Mean', meanBefore, meanAfter),
      ],
    ),
  )
}

/** First and later scores by the reviewer's number, with the means; the first stand unchanged. */
export function ScoresAtTable({ view }: { view: TableView }) {
  const { scores, meanBefore, meanAfter } = view
  if (scores.length === 0) return <p className="m-0 text-table text-muted">No review of it was finished.</p>
  const number = (value: number | null) => (value === null ? ABSENT : formatNumber(value, 2))
  const shifted = (before: number | null, after: number | null) => {
    const by = shift(before, after)
    return by === null ? '' : formatSigned(by, 2)
  }
  return (
    <div className="max-w-md">
      <p className="mt-0 mb-1 text-right text-table" data-no-print>
        <LinkLikeButton aria-label="Scores as CSV" onClick={() => save(view)}>
          CSV
        </LinkLikeButton>
      </p>
      <table className="w-full text-table tabular-nums">
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
              <td className="py-2 text-right text-muted">{shifted(before, after)}</td>
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
            <td className="py-2 text-right">{shifted(meanBefore, meanAfter)}</td>
          </tr>
        </tfoot>
      </table>
    </div>
  )
}
