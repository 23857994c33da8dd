import { stackLevels } from '@/components/charts/geometry/stackLevels'
import type { DiscussedProposal } from '@/lib/domain/rankings/readDiscussion'
import { formatNumber } from '@/lib/format'

const width = 288
const step = 20
const x = (score: number) => 8 + (score / 10) * (width - 24)

/** The scores on the scale 0 to 10, each with its reviewer's number beside it, stacked where they agree; the mean as a tick. */
export function ScoreSpread({ proposal }: { proposal: DiscussedProposal }) {
  const { scores, raw } = proposal
  const levels = stackLevels(
    scores.map((one) => x(one.score)),
    30,
  )
  const axis = (Math.max(0, ...levels) + 1) * step + 6
  return (
    <svg
      role="img"
      aria-label={
        scores.length > 0
          ? `Scores ${scores.map((one) => `${formatNumber(one.score, 2)} by reviewer ${one.reviewer}`).join(', ')}`
          : 'No scores yet'
      }
      width={width}
      height={axis + 20}
      className="max-w-full"
    >
      <path d={`M${x(0)} ${axis}H${x(10)}`} stroke="var(--ink)" />
      {[0, 2, 4, 6, 8, 10].map((tick) => (
        <g key={tick}>
          <path d={`M${x(tick)} ${axis}V${axis + 6}`} stroke="var(--ink)" />
          <text x={x(tick)} y={axis + 18} textAnchor="middle" fontSize="12" fill="var(--ink-muted)">
            {tick}
          </text>
        </g>
      ))}
      {raw === null ? null : <path d={`M${x(raw)} 2V${axis}`} stroke="var(--lamp)" strokeWidth="2" />}
      {scores.map((one, index) => {
        const y = axis - 10 - (levels[index] ?? 0) * step
        return (
          <g key={one.reviewer}>
            <circle
              cx={x(one.score)}
              cy={y}
              r="4"
              fill="var(--ground)"
              stroke="var(--s1)"
              strokeWidth="1.8"
            />
            <text x={x(one.score) + 8} y={y + 4} fontSize="11" fill="var(--ink)" className="ground-halo">
              {one.reviewer}
            </text>
          </g>
        )
      })}
    </svg>
  )
}
