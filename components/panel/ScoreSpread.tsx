import type { DiscussedProposal } from '@/lib/domain/rankings/readDiscussion'
import { formatNumber } from '@/lib/format'

const width = 260
const x = (score: number) => 8 + (score / 10) * (width - 16)

/** The scores on the scale 0 to 10, each with its reviewer's number; the mean as a tick. */
export function ScoreSpread({ proposal }: { proposal: DiscussedProposal }) {
  const { scores, raw } = proposal
  return (
    <svg
      role="img"
      aria-label={
        scores.length > 0
          ? `Scores ${scores.map((one) => `${formatNumber(one.score, 2)} by reviewer ${one.reviewer}`).join(', ')}`
          : 'No scores yet'
      }
      width={width}
      height="58"
    >
      <path d={`M${x(0)} 38H${x(10)}`} stroke="var(--ink)" />
      {[0, 2, 4, 6, 8, 10].map((tick) => (
        <g key={tick}>
          <path d={`M${x(tick)} 38V44`} stroke="var(--ink)" />
          <text x={x(tick)} y="56" textAnchor="middle" fontSize="12" fill="var(--ink-muted)">
            {tick}
          </text>
        </g>
      ))}
      {raw === null ? null : <path d={`M${x(raw)} 16V38`} stroke="var(--lamp)" strokeWidth="2" />}
      {scores.map((one, index) => (
        <g key={one.reviewer}>
          <circle cx={x(one.score)} cy="30" r="4" fill="none" stroke="var(--s1)" strokeWidth="1.8" />
          <text
            x={x(one.score)}
            y={index % 2 === 0 ? 20 : 10}
            textAnchor="middle"
            fontSize="11"
            fill="var(--ink-muted)"
          >
            {one.reviewer}
          </text>
        </g>
      ))}
    </svg>
  )
}
