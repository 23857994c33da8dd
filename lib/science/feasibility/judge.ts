import type { Verdict } from './types'

/** Verdict of a value that is better the larger it is: feasible from `good`, not feasible below `bad`. */
export function judgeAtLeast(value: number, good: number, bad: number): Verdict {
  if (value >= good) return 'feasible'
  return value >= bad ? 'marginal' : 'not-feasible'
}

/** Verdict of a value that is better the smaller it is: feasible to `good`, not feasible above `bad`. */
export function judgeAtMost(value: number, good: number, bad: number): Verdict {
  if (value <= good) return 'feasible'
  return value <= bad ? 'marginal' : 'not-feasible'
}

const order = { feasible: 0, marginal: 1, 'not-feasible': 2 } as const

/** The worst of some verdicts; feasible when there are none. */
export function worst(verdicts: readonly Verdict[]): Verdict {
  return verdicts.reduce<Verdict>((low, next) => (order[next] > order[low] ? next : low), 'feasible')
}

/** The n-th best of some verdicts; not feasible when there are fewer. */
export function nthBest(verdicts: readonly Verdict[], n: number): Verdict {
  const sorted = [...verdicts].sort((a, b) => order[a] - order[b])
  return n <= 0 ? 'feasible' : (sorted[n - 1] ?? 'not-feasible')
}
