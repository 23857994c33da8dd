import { scoreRuler, scoreX } from './scoreRuler'

const { width, height, baseline, max, from, to } = scoreRuler
const halves = Array.from({ length: max * 2 + 1 }, (_, index) => index / 2)

/** The drawn ruler: ticks, digits, the bar from 0 and the pointer at the score. */
export function ScoreRulerPicture({ score }: { score: number | null }) {
  const x = score === null ? null : scoreX(score)
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      className="block w-full overflow-visible"
      aria-hidden="true"
      focusable="false"
    >
      <path d={`M${from} ${baseline}H${to}`} stroke="var(--edge)" strokeWidth="1.5" />
      {halves.map((half) => {
        const whole = half % 1 === 0
        const reached = score !== null && half <= score
        return (
          <g key={half}>
            <path
              d={`M${scoreX(half)} ${baseline}V${baseline - (whole ? 12 : 7)}`}
              stroke={reached ? 'var(--accent)' : 'var(--edge)'}
              strokeWidth="1.5"
            />
            {whole ? (
              <text
                x={scoreX(half)}
                y={baseline + 16}
                textAnchor="middle"
                fontSize="12"
                fill={half === score ? 'var(--ink)' : 'var(--ink-muted)'}
                fontWeight={half === score ? 600 : 400}
              >
                {half}
              </text>
            ) : null}
          </g>
        )
      })}
      {x !== null ? (
        <>
          <path d={`M${from} ${baseline}H${x}`} stroke="var(--accent)" strokeWidth="4" />
          <path d={`M${x - 7} 4H${x + 7}V17L${x} 24L${x - 7} 17Z`} fill="var(--accent)" />
          <rect className="score-ring" x={x - 12} y="0" width="24" height="30" rx="4" />
        </>
      ) : (
        <rect className="score-ring" x="1.5" y="8" width={width - 3} height={height - 10} rx="4" />
      )}
    </svg>
  )
}
