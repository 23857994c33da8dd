import { at } from '@/lib/science/numeric/at'
import { quadratic } from './cholesky'
import type { Design } from './design'
import type { MixedFit } from './mixedFit'
import type { Leniency, Merit } from './types'

/** Share of a proposal's mean residual that counts as merit: n ratio / (1 + n ratio). */
const shrinkage = (count: number, ratio: number) => (count * ratio) / (1 + count * ratio)

/** What is added to a score's merit by each fixed column when merit = mean + BLUP: e0 − shrinkage x mean row. */
export function meritContrast(fit: MixedFit, group: MixedFit['groups'][number]): Float64Array {
  const share = shrinkage(group.count, fit.ratio) / group.count
  return group.x.map((value, column) => (column === 0 ? 1 : 0) - share * value)
}

/** Best linear unbiased predictions on the scale of the scores, with their posterior errors. */
export function meritsOf(design: Design, fit: MixedFit): Merit[] {
  return design.proposals.map((proposal, index) => {
    const group = fit.groups[index]
    if (!group) throw new RangeError(`no scores of proposal ${proposal}`)
    const contrast = meritContrast(fit, group)
    const share = shrinkage(group.count, fit.ratio)
    let merit = (share * group.y) / group.count
    for (let column = 0; column < design.columns; column += 1)
      merit += at(contrast, column) * at(fit.fixed, column)
    const variance =
      fit.errorVariance * (fit.ratio / (1 + group.count * fit.ratio) + quadratic(fit.factor, contrast))
    return { proposal, merit, error: Math.sqrt(variance) }
  })
}

/** Leniency of each reviewer, harshest first; they sum to zero. */
export function lenienciesOf(design: Design, fit: MixedFit): Leniency[] {
  const last = design.reviewers.length - 1
  return design.reviewers
    .map((reviewer, seat) => {
      const contrast = new Float64Array(design.columns)
      if (seat === last) contrast.fill(-1, 1)
      else contrast[seat + 1] = 1
      const points = contrast.reduce((sum, value, column) => sum + value * at(fit.fixed, column), 0)
      return { reviewer, points, error: Math.sqrt(fit.errorVariance * quadratic(fit.factor, contrast)) }
    })
    .sort((a, b) => a.points - b.points || a.reviewer - b.reviewer)
}
