import { at } from '@/lib/science/numeric/at'
import { backward, cholesky, forward, logDeterminant, zeros, type Matrix } from './cholesky'
import type { Design } from './design'

/** The model solved at one ratio of variances. */
export interface MixedFit {
  /** Merit variance over error variance. */
  ratio: number
  /** Generalised least squares estimate of the fixed part. */
  fixed: Float64Array
  /** Factor of XᵀR⁻¹X, with R = I + ratio Z Zᵀ. */
  factor: Matrix
  /** Error variance, REML. */
  errorVariance: number
  /** −2 log restricted likelihood, up to a constant. */
  deviance: number
  groups: { count: number; x: Float64Array; y: number }[]
}

function groupSums(design: Design): MixedFit['groups'] {
  const groups = design.proposals.map(() => ({ count: 0, x: new Float64Array(design.columns), y: 0 }))
  for (const row of design.rows) {
    const group = groups[row.group]
    if (!group) continue
    group.count += 1
    group.y += row.y
    for (let c = 0; c < design.columns; c += 1) group.x[c] = at(group.x, c) + at(row.x, c)
  }
  return groups
}

/**
 * Solves y = X b + Z m + e, var(m) = ratio s², var(e) = s², for b and s² by generalised least squares (Henderson 1975;
 * restricted likelihood: Patterson & Thompson 1971). Within a proposal R⁻¹ = I − ratio / (1 + n ratio) 11ᵀ, so nothing
 * larger than reviewers x reviewers is ever factored. Null where X is not of full rank or no error is left.
 */
export function mixedFit(design: Design, ratio: number): MixedFit | null {
  const p = design.columns
  const groups = groupSums(design)
  const a = zeros(p)
  const b = new Float64Array(p)
  const add = (x: Float64Array, y: number, weight: number) => {
    for (let i = 0; i < p; i += 1) {
      if (x[i] === 0) continue
      b[i] = at(b, i) + weight * at(x, i) * y
      for (let j = 0; j < p; j += 1)
        a.values[i * p + j] = at(a.values, i * p + j) + weight * at(x, i) * at(x, j)
    }
  }
  for (const row of design.rows) add(row.x, row.y, 1)
  for (const group of groups) add(group.x, group.y, -ratio / (1 + group.count * ratio))
  const factor = cholesky(a)
  const degrees = design.rows.length - p
  if (!factor || degrees < 1) return null
  const fixed = backward(factor, forward(factor, b))

  const residual = (x: Float64Array, y: number) => {
    let value = y
    for (let i = 0; i < p; i += 1) value -= at(x, i) * at(fixed, i)
    return value
  }
  let quadraticSum = 0
  let logR = 0
  for (const row of design.rows) quadraticSum += residual(row.x, row.y) ** 2
  for (const group of groups) {
    quadraticSum -= (ratio / (1 + group.count * ratio)) * residual(group.x, group.y) ** 2
    logR += Math.log(1 + group.count * ratio)
  }
  const errorVariance = quadraticSum / degrees
  if (!(errorVariance > 1e-12)) return null
  const deviance = degrees * Math.log(errorVariance) + logR + logDeterminant(factor)
  return { ratio, fixed, factor, errorVariance, deviance, groups }
}
