/** One finished review: the weighted score, 0 to 10, a reviewer gave a proposal before discussion. */
export interface Score {
  proposal: number
  reviewer: number
  score: number
}

/** A reviewer's leniency: points above (+) or below (−) what colleagues give the same proposals. */
export interface Leniency {
  reviewer: number
  points: number
  /** One sigma, points. */
  error: number
}

export interface Merit {
  proposal: number
  /** On the scale of the scores, as the average reviewer would give it. */
  merit: number
  /** Posterior standard deviation, points. */
  error: number
}

/** F test of 'all reviewers are equally lenient'. */
export interface LeniencyTest {
  f: number
  between: number
  within: number
  p: number
}

export interface MeritFit {
  merits: Merit[]
  leniencies: Leniency[]
  test: LeniencyTest | null
  /** True when leniency was taken out of the merits. */
  corrected: boolean
  /** Why not, in a sentence; null when it was. */
  whyNot: string | null
  /** Variance of merit between proposals, points squared. */
  meritVariance: number
  /** Variance left over in one score, points squared. */
  leftVariance: number
  meanReviews: number
}
