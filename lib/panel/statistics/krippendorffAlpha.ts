import type { Score } from './types'

/**
 * Krippendorff's alpha for interval data with gaps (Krippendorff 2011): one minus observed over expected disagreement,
 * squared differences, only proposals with two scores or more. 1 is full agreement, 0 is chance; null when nothing
 * can be compared or all scores are equal.
 */
export function krippendorffAlpha(scores: readonly Score[]): number | null {
  const units = new Map<number, number[]>()
  for (const { proposal, score } of scores) {
    const unit = units.get(proposal)
    if (unit) unit.push(score)
    else units.set(proposal, [score])
  }
  let n = 0
  let sum = 0
  let squares = 0
  let observed = 0
  for (const values of units.values()) {
    const m = values.length
    if (m < 2) continue
    const total = values.reduce((a, b) => a + b, 0)
    const square = values.reduce((a, b) => a + b * b, 0)
    // Over ordered pairs, sum (a − b)² = 2 m Σa² − 2 (Σa)².
    observed += (2 * m * square - 2 * total * total) / (m - 1)
    n += m
    sum += total
    squares += square
  }
  const expected = (2 * n * squares - 2 * sum * sum) / (n - 1)
  if (n < 2 || !(expected > 1e-12)) return null
  return 1 - observed / expected
}
