import { at } from '@/lib/science/numeric/at'
import { seededNormal } from '../random'
import { backward } from './cholesky'
import type { FittedModel } from './fitMerit'
import { meritContrast } from './meritsOf'

export interface RankDistribution {
  proposal: number
  /** Draws in which it came at rank 1, 2, …; they sum to the number of draws. */
  counts: number[]
}

/**
 * How sure the ranking is: merits drawn from the posterior of the fitted model (variances held at their REML
 * estimates, fixed part with a flat prior), ranked in each draw (Goldstein & Spiegelhalter 1996).
 */
export function rankDraws(model: FittedModel, seed: number, draws = 2000): RankDistribution[] {
  const { design, fit } = model
  const normal = seededNormal(seed)
  const size = design.proposals.length
  const counts = design.proposals.map(() => new Array<number>(size).fill(0))
  const sigma = Math.sqrt(fit.errorVariance)
  const parts = fit.groups.map((group) => ({
    contrast: meritContrast(fit, group),
    own: sigma * Math.sqrt(fit.ratio / (1 + group.count * fit.ratio)),
  }))
  const centre = model.summary.merits.map(({ merit }) => merit)
  for (let draw = 0; draw < draws; draw += 1) {
    const shift = backward(
      fit.factor,
      Float64Array.from({ length: design.columns }, () => sigma * normal()),
    )
    const drawn = parts.map(({ contrast, own }, index) => {
      let value = at(centre, index) + own * normal()
      for (let column = 0; column < design.columns; column += 1)
        value += at(contrast, column) * at(shift, column)
      return { index, value }
    })
    drawn.sort((a, b) => b.value - a.value)
    drawn.forEach(({ index }, rank) => {
      const own = counts[index]
      if (own) own[rank] = (own[rank] ?? 0) + 1
    })
  }
  return design.proposals.map((proposal, index) => ({ proposal, counts: counts[index] ?? [] }))
}

/** Chance that the proposal belongs above a line drawn after rank `line`. */
export function chanceAbove({ counts }: RankDistribution, line: number): number {
  const total = counts.reduce((sum, count) => sum + count, 0)
  const above = counts.slice(0, Math.max(0, line)).reduce((sum, count) => sum + count, 0)
  return total > 0 ? above / total : 0
}

/** Smallest rank not exceeded in a share `quantile` of the draws. */
export function rankQuantile({ counts }: RankDistribution, quantile: number): number {
  const total = counts.reduce((sum, count) => sum + count, 0)
  let reached = 0
  for (let rank = 0; rank < counts.length; rank += 1) {
    reached += at(counts, rank)
    if (reached >= quantile * total) return rank + 1
  }
  return counts.length
}
