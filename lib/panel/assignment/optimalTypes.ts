import type { Pairing, ToRead } from './types'

export interface OptimalInput {
  proposals: readonly ToRead[]
  reviewers: readonly number[]
  /** Pairs that stand already; they are kept. */
  standing: readonly Pairing[]
  /** Readers wanted for each proposal. */
  each: number
  /** How well a reviewer knows the subject of a proposal, 0 to 1. */
  affinity: (proposal: number, reviewer: number) => number
  /** Whole pages by which a load may differ from the mean; the longest proposal unless told. */
  tolerancePages?: number
  /** Time for all solving together. */
  seconds: number
}

/** A load outside the mean +- tolerance, with the pages by which it is. */
export interface LoadOutside {
  reviewer: number
  pages: number
  byPages: number
}

export interface OptimalAssignments {
  /** What is new; standing pairs are not repeated. */
  pairs: Pairing[]
  /** Proposals that cannot have as many readers as wanted, with how many they lack: all others are barred from them. */
  short: { proposal: number; lacking: number }[]
  meanPages: number
  tolerancePages: number
  outside: LoadOutside[]
  /** Affinity summed over its readers, of the proposal served worst among those with all their readers; and what nothing can exceed. */
  worst: { value: number; bound: number }
  /** Affinity summed over all pairs, and what no assignment that serves the worst as well can exceed. */
  sum: { value: number; bound: number }
  /** Groups of reviewers who share no proposal; one is what is wanted. */
  groups: number
  /** Why there is more than one; null when there is not. */
  whyNotLinked: string | null
}
