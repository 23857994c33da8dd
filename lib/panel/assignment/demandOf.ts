import type { OptimalInput } from './optimalTypes'
import type { ToRead } from './types'

export interface Demand {
  proposal: ToRead
  /** Who reads it already. */
  standing: number[]
  /** Who else may. */
  free: number[]
  /** Readers still to be found among them, as far as there are enough. */
  wanted: number
  /** Readers that cannot be found. */
  lacking: number
}

/** What each proposal needs and whom it may have. */
export function demandOf({ proposals, reviewers, standing, each }: OptimalInput): Demand[] {
  const reads = new Map<number, number[]>(proposals.map(({ id }) => [id, []]))
  for (const { proposal, reviewer } of standing) reads.get(proposal)?.push(reviewer)
  return proposals.map((proposal) => {
    const held = reads.get(proposal.id) ?? []
    const free = reviewers.filter((id) => !proposal.barred.has(id) && !held.includes(id))
    const missing = Math.max(0, each - held.length)
    const wanted = Math.min(missing, free.length)
    return { proposal, standing: held, free, wanted, lacking: missing - wanted }
  })
}
