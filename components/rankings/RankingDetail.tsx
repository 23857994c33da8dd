import type { RankingRow } from '@/lib/domain/rankings/rankingView'
import { formatNumber, formatUtc } from '@/lib/format'

export interface RankingDetailProps {
  row: RankingRow
  isOpen: boolean
  /** Words on the line, where it passes under this row. */
  line: string | null
}

/** Under a row: why merit differs, the scores by number, moves by hand; and the line, where it passes. */
export function RankingDetail({ row, isOpen, line }: RankingDetailProps) {
  return (
    <>
      {isOpen ? (
        <div className="flex flex-col gap-1 pb-2 text-table">
          {row.why ? <p className="m-0 max-w-prose">{row.why}</p> : null}
          <p className="m-0 text-muted">
            {row.scores.length > 0
              ? `Scores: ${row.scores.map((one) => `${formatNumber(one.score, 2)} (reviewer ${one.reviewer})`).join(', ')}.`
              : 'No finished review.'}
            {row.spread === null ? '' : ` Spread ${formatNumber(row.spread, 2)}.`}
          </p>
          {row.moves.map((move) => (
            <p key={move.at} className="m-0 text-muted">
              Moved {move.isUp ? 'up' : 'down'} by {move.by ?? 'the panel'}, {formatUtc(new Date(move.at))}:{' '}
              {move.reason}
            </p>
          ))}
        </div>
      ) : null}
      {line ? (
        <div className="-mb-2 flex justify-end border-b-2 border-lamp">
          <span className="rounded-t bg-lamp px-2 py-0.5 text-caption font-semibold text-on-lamp">
            {line}
          </span>
        </div>
      ) : null}
    </>
  )
}
