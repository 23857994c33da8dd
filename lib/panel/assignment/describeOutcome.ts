import { connectedGroups } from '../statistics'
import type { Demand } from './demandOf'
import type { LoadOutside } from './optimalTypes'

type Pair = { proposal: number; reviewer: number }

/** What a set of new pairs comes to, together with what stands. */
export interface Outcome {
  pairs: Pair[]
  groups: number[][]
  outside: LoadOutside[]
  outsidePages: number
  /** Null when no proposal can have all its readers. */
  worst: number | null
  sum: number
}

/** Loads, worst-served proposal and groups, counted from the pairs alone. */
export function describeOutcome(
  pairs: Pair[],
  demands: readonly Demand[],
  reviewers: readonly number[],
  range: { leastPages: number; mostPages: number },
  affinity: (proposal: number, reviewer: number) => number,
): Outcome {
  const readers = new Map(demands.map(({ proposal, standing }) => [proposal.id, [...standing]]))
  for (const { proposal, reviewer } of pairs) readers.get(proposal)?.push(reviewer)
  const loads = new Map(reviewers.map((id) => [id, 0]))
  let worst: number | null = null
  let sum = 0
  for (const { proposal, lacking } of demands) {
    let own = 0
    for (const reviewer of readers.get(proposal.id) ?? []) {
      own += affinity(proposal.id, reviewer)
      const load = loads.get(reviewer)
      if (load !== undefined) loads.set(reviewer, load + proposal.pages)
    }
    sum += own
    if (lacking === 0) worst = Math.min(worst ?? Infinity, own)
  }
  const outside = [...loads].flatMap(([reviewer, pages]) => {
    const byPages = Math.max(range.leastPages - pages, pages - range.mostPages)
    return byPages > 0 ? [{ reviewer, pages, byPages }] : []
  })
  return {
    pairs,
    groups: connectedGroups(
      [...readers].flatMap(([proposal, own]) => own.map((reviewer) => ({ proposal, reviewer }))),
    ),
    outside,
    outsidePages: outside.reduce((total, { byPages }) => total + byPages, 0),
    worst,
    sum,
  }
}
