import type { Score } from './types'

/** The scores as the model sees them: y = X b + Z m + e, with the rows of X kept whole. */
export interface Design {
  proposals: number[]
  reviewers: number[]
  columns: number
  rows: { group: number; x: Float64Array; y: number }[]
}

/**
 * X holds the general mean and, with `leniency`, one column a reviewer but the last, coded so that leniencies sum to
 * zero; Z holds the proposals.
 */
export function designOf(scores: readonly Score[], leniency: boolean): Design {
  const ascending = (a: number, b: number) => a - b
  const proposals = [...new Set(scores.map((score) => score.proposal))].sort(ascending)
  const reviewers = [...new Set(scores.map((score) => score.reviewer))].sort(ascending)
  const columns = leniency ? reviewers.length : 1
  const groupOf = new Map(proposals.map((id, index) => [id, index]))
  const seatOf = new Map(reviewers.map((id, index) => [id, index]))
  const rows = scores.map(({ proposal, reviewer, score }) => {
    const x = new Float64Array(columns)
    x[0] = 1
    if (leniency) {
      const seat = seatOf.get(reviewer) ?? 0
      if (seat === reviewers.length - 1) x.fill(-1, 1)
      else x[seat + 1] = 1
    }
    return { group: groupOf.get(proposal) ?? 0, x, y: score }
  })
  return { proposals, reviewers, columns, rows }
}
