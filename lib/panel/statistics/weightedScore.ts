export interface CriterionScore {
  weight: number
  /** 0 to 20; null while the reviewer has not scored it. */
  halfPoints: number | null
}

/**
 * Score of a review, 0 to 10: the weighted mean of its criteria, in points.
 * Null while a criterion is open or there are none.
 */
export function weightedScore(criteria: readonly CriterionScore[]): number | null {
  let sum = 0
  let weights = 0
  for (const { weight, halfPoints } of criteria) {
    if (halfPoints === null) return null
    sum += weight * halfPoints
    weights += weight
  }
  return weights > 0 ? sum / (2 * weights) : null
}
