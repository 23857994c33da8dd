import type { VerdictShape } from './verdictGlyphPath'

export type MarkedVerdict = 'feasible' | 'marginal' | 'not-feasible' | 'accepted' | 'change' | 'not-possible'

interface VerdictStyle {
  shape: VerdictShape
  word: string
  colour: string
  bar: string
}

const feasible = { shape: 'clear', colour: 'text-feasible', bar: 'border-feasible' } as const
const marginal = { shape: 'touching', colour: 'text-marginal', bar: 'border-marginal' } as const
const notFeasible = { shape: 'past', colour: 'text-not-feasible', bar: 'border-not-feasible' } as const

/** Sign, word and colour of each verdict; the assessment's words share the three signs. */
export const verdictStyles: Record<MarkedVerdict, VerdictStyle> = {
  feasible: { ...feasible, word: 'feasible' },
  marginal: { ...marginal, word: 'marginal' },
  'not-feasible': { ...notFeasible, word: 'not feasible' },
  accepted: { ...feasible, word: 'accepted' },
  change: { ...marginal, word: 'change' },
  'not-possible': { ...notFeasible, word: 'not possible' },
}
