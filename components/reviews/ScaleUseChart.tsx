'use client'

import { ChartFrame } from '@/components/charts/ChartFrame'
import { histogram } from '@/components/charts/geometry/histogram'
import type { ScaleUse } from '@/lib/domain/reviews/types'
import { countInWords, formatNumber } from '@/lib/format'

export interface ScaleUseChartProps {
  scale: ScaleUse
  callNumber: number
}

const size = { width: 322, height: 96, ground: 104 }
const total = (counts: readonly number[]) => counts.reduce((sum, count) => sum + count, 0)
const shares = (counts: readonly number[]) => counts.map((count) => count / Math.max(1, total(counts)))
const meanOf = (counts: readonly number[]) =>
  counts.reduce((sum, count, half) => sum + (count * half) / 2, 0) / Math.max(1, total(counts))

/** How a reviewer has used the scale: own scores as bars; the other readers' together as an outline, where they are shown. */
export function ScaleUseChart({ scale, callNumber }: ScaleUseChartProps) {
  const { own, others } = scale
  if (total(own) === 0) return null
  const [mine, theirs] = [shares(own), others ? shares(others) : null]
  const plot = histogram(own.length, size, Math.max(...mine, ...(theirs ?? [])))
  const words = `${countInWords(total(own), 'score', 'scores')} of yours, ${formatNumber(meanOf(own), 1)} on average`
  const behind = others
    ? `the other readers: ${countInWords(total(others), 'score', 'scores')}, ${formatNumber(meanOf(others), 1)} on average`
    : null
  return (
    <ChartFrame
      title={`Call ${callNumber}`}
      brief
      fileName={`use-of-the-scale-call-${callNumber}`}
      numbers={{
        caption: `Your use of the scale, call ${callNumber}`,
        columns: [
          { head: 'Score', decimals: 1 },
          { head: 'Yours', decimals: 0 },
          ...(others ? [{ head: 'Other readers', decimals: 0 }] : []),
        ],
        rows: own.map((count, half) => [half / 2, count, ...(others ? [others[half] ?? 0] : [])]),
      }}
    >
      <svg
        role="img"
        aria-label={[words, behind].filter(Boolean).join('; ')}
        viewBox={`-3 0 ${size.width + 6} 124`}
        width={size.width + 6}
        height="124"
        className="block max-w-full"
      >
        {mine.map((share, half) => (
          <rect
            key={half}
            x={plot.x(half) + 1.5}
            y={size.ground - plot.height(share)}
            width={plot.step - 3}
            height={plot.height(share)}
            fill="var(--s1)"
          />
        ))}
        {theirs ? <path d={plot.outline(theirs)} fill="none" stroke="var(--s2)" strokeWidth="1.8" /> : null}
        <path d={`M0 ${size.ground + 0.5}H${size.width}`} stroke="var(--edge)" />
        {[0, 2, 4, 6, 8, 10].map((score) => (
          <text
            key={score}
            x={plot.x(2 * score + 0.5)}
            y="120"
            textAnchor="middle"
            className="fill-muted text-tick"
          >
            {score}
          </text>
        ))}
      </svg>
      <p className="mt-2 mb-0 max-w-prose text-caption text-muted">
        Bars: {words}.{behind ? ` Outline: ${behind}.` : ''} {scale.whyAlone}
      </p>
    </ChartFrame>
  )
}
