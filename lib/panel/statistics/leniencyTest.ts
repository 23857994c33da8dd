import { at } from '@/lib/science/numeric/at'
import { backward, cholesky, forward, zeros } from './cholesky'
import type { Design } from './design'
import { fTail } from './fTail'
import type { LeniencyTest } from './types'

/**
 * Are the reviewers equally lenient? The exact F test of reviewers adjusted for proposals in the two-way layout
 * (both fixed, so that it rests on comparisons within proposals alone). Null when too few scores overlap.
 */
export function leniencyTest(design: Design): LeniencyTest | null {
  const between = design.reviewers.length - 1
  const within = design.rows.length - design.proposals.length - between
  if (between < 1 || within < 1) return null
  const sums = design.proposals.map(() => ({ count: 0, x: new Float64Array(design.columns), y: 0 }))
  for (const row of design.rows) {
    const sum = sums[row.group]
    if (!sum) continue
    sum.count += 1
    sum.y += row.y
    for (let c = 0; c < design.columns; c += 1) sum.x[c] = at(sum.x, c) + at(row.x, c)
  }
  // Deviations from the proposal's mean take every proposal out at once.
  const a = zeros(between)
  const b = new Float64Array(between)
  let total = 0
  for (const row of design.rows) {
    const sum = sums[row.group]
    if (!sum) continue
    const x = Float64Array.from(
      { length: between },
      (_, i) => at(row.x, i + 1) - at(sum.x, i + 1) / sum.count,
    )
    const y = row.y - sum.y / sum.count
    total += y * y
    for (let i = 0; i < between; i += 1) {
      b[i] = at(b, i) + at(x, i) * y
      for (let j = 0; j < between; j += 1)
        a.values[i * between + j] = at(a.values, i * between + j) + at(x, i) * at(x, j)
    }
  }
  const factor = cholesky(a)
  if (!factor) return null
  const effects = backward(factor, forward(factor, b))
  const explained = effects.reduce((sum, effect, index) => sum + effect * at(b, index), 0)
  const left = (total - explained) / within
  if (!(left > 1e-12)) return null
  const f = explained / between / left
  return { f, between, within, p: fTail(f, between, within) }
}
