import { connectedGroups } from './connectedGroups'
import { designOf, type Design } from './design'
import { leniencyTest } from './leniencyTest'
import { lenienciesOf, meritsOf } from './meritsOf'
import type { MixedFit } from './mixedFit'
import { remlFit } from './remlFit'
import type { MeritFit, Score } from './types'

/** Leniency is taken out only where chance would give so large a difference in less than one case in twenty. */
const leniencyLimit = 0.05

export interface FittedModel {
  design: Design
  fit: MixedFit
  summary: MeritFit
}

/**
 * Merit of each proposal from scores before discussion: proposals random, reviewer leniency fixed, variances by REML,
 * merit as BLUP. Adding a constant to all scores of one reviewer changes no difference between merits.
 * Leniency stays in where it is not significant or the reviewers fall into groups that share no proposal.
 * Null when there is too little to fit: fewer than two proposals, or no scores beyond them.
 */
export function fitMerit(scores: readonly Score[]): FittedModel | null {
  const groups = connectedGroups(scores)
  const full = designOf(scores, true)
  const test = groups.length === 1 ? leniencyTest(full) : null
  const fitted = groups.length === 1 && full.reviewers.length > 1 ? remlFit(full) : null
  const corrected = Boolean(fitted && test && test.p < leniencyLimit)
  const design = corrected ? full : designOf(scores, false)
  const fit = corrected ? fitted : remlFit(design)
  if (!fit || design.proposals.length < 2) return null
  const whyNot = corrected
    ? null
    : groups.length > 1
      ? 'The reviewers fall into groups that share no proposal, so leniency cannot be told from merit.'
      : !test
        ? 'Too few proposals are shared between reviewers to measure leniency.'
        : 'The differences between reviewers are no larger than chance gives.'
  return {
    design,
    fit,
    summary: {
      merits: meritsOf(design, fit),
      leniencies: fitted ? lenienciesOf(full, fitted) : [],
      test,
      corrected,
      whyNot,
      meritVariance: fit.ratio * fit.errorVariance,
      leftVariance: fit.errorVariance,
      meanReviews: scores.length / design.proposals.length,
    },
  }
}
