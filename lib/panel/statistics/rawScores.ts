import type { Score } from './types'

export interface RawScore {
  proposal: number
  mean: number
  /** Standard deviation between reviewers (n − 1), points; null with fewer than two. */
  spread: number | null
  lowest: number
  highest: number
  reviews: number
}

/** Mean and spread of each proposal's scores, best mean first; equal means keep the order of their keys. */
export function rawScores(scores: readonly Score[]): RawScore[] {
  const byProposal = new Map<number, number[]>()
  for (const { proposal, score } of scores) {
    const list = byProposal.get(proposal)
    if (list) list.push(score)
    else byProposal.set(proposal, [score])
  }
  return [...byProposal]
    .map(([proposal, values]) => {
      const mean = values.reduce((sum, value) => sum + value, 0) / values.length
      const squares = values.reduce((sum, value) => sum + (value - mean) ** 2, 0)
      return {
        proposal,
        mean,
        spread: values.length > 1 ? Math.sqrt(squares / (values.length - 1)) : null,
        lowest: Math.min(...values),
        highest: Math.max(...values),
        reviews: values.length,
      }
    })
    .sort((a, b) => b.mean - a.mean || a.proposal - b.proposal)
}
