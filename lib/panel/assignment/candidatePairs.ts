import type { Demand } from './demandOf'
import { tieBreak } from './tieBreak'

/** A pair that may be made. */
export interface Candidate {
  proposal: number
  reviewer: number
  affinity: number
}

/** More pairs than this make a programme that takes minutes. */
const MOST_PAIRS = 40_000

/**
 * The pairs the solver chooses from: all that may be made or, on a large panel, for each proposal its best readers
 * and as many others, so that loads can still be evened out.
 */
export function candidatePairs(
  demands: readonly Demand[],
  affinity: (proposal: number, reviewer: number) => number,
): Candidate[] {
  const open = demands.filter(({ wanted }) => wanted > 0)
  const all = open.reduce((sum, { free }) => sum + free.length, 0)
  return open.flatMap(({ proposal, free, wanted }) => {
    const own = free.map((reviewer) => ({
      proposal: proposal.id,
      reviewer,
      affinity: affinity(proposal.id, reviewer),
    }))
    if (all <= MOST_PAIRS) return own
    const most = Math.max(2 * wanted + 4, Math.floor(MOST_PAIRS / open.length))
    const chance = new Map(own.map((pair) => [pair, tieBreak(pair.proposal, pair.reviewer)]))
    const byChance = (a: Candidate, b: Candidate) => (chance.get(a) ?? 0) - (chance.get(b) ?? 0)
    own.sort((a, b) => b.affinity - a.affinity || byChance(a, b))
    const best = own.slice(0, Math.ceil(most / 2))
    const others = own.slice(best.length).sort(byChance)
    return [...best, ...others.slice(0, most - best.length)].sort((a, b) => a.reviewer - b.reviewer)
  })
}
