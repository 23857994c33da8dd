import type { MeritFit } from './types'

export interface Agreement {
  /** Reliability of one review, 0 to 1. */
  single: number
  /** Reliability of the mean of the reviews a proposal has. */
  mean: number
  /** Standard deviation left over in one score, points. */
  leftOver: number
}

/**
 * Intraclass correlations from the variance components: merit / (merit + error) for one review, and with the error
 * divided by the number of reviews for their mean (Shrout & Fleiss 1979: the third form when leniency is fixed).
 */
export function agreement(fit: Pick<MeritFit, 'meritVariance' | 'leftVariance' | 'meanReviews'>): Agreement {
  const { meritVariance, leftVariance, meanReviews } = fit
  return {
    single: meritVariance / (meritVariance + leftVariance),
    mean: meritVariance / (meritVariance + leftVariance / meanReviews),
    leftOver: Math.sqrt(leftVariance),
  }
}
