import type { ReactNode } from 'react'
import { classNames } from './classNames'
import { VerdictGlyph } from './VerdictGlyph'
import { verdictStyles, type MarkedVerdict } from './verdictStyles'

export interface VerdictMarkProps {
  /** A computed verdict, or an assessment, which uses the same three signs with its own words. */
  verdict: MarkedVerdict
  /** Stands for the usual word: `Not feasible: HE 0435−1223`. */
  words?: ReactNode
  size?: 'chip' | 'text' | 'heading'
  strong?: boolean
}

const heights = { chip: 10, text: 12, heading: 16 } as const

/** The only sign for feasible, marginal, not feasible: the bar against its limit, never without its word. */
export function VerdictMark({ verdict, words, size = 'text', strong = false }: VerdictMarkProps) {
  const { shape, word, colour } = verdictStyles[verdict]
  return (
    <span
      className={classNames(
        'inline-flex items-baseline gap-2',
        colour,
        size === 'heading' ? 'text-section' : 'font-medium',
        strong && 'font-semibold',
      )}
    >
      <VerdictGlyph shape={shape} height={heights[size]} />
      <span className={words === undefined ? 'whitespace-nowrap' : undefined}>{words ?? word}</span>
    </span>
  )
}
