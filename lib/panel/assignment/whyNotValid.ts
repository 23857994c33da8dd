import type { OptimalInput } from './optimalTypes'

/**
 * Why a list of new pairs must not be used, or null: looks at the input alone, so that nothing a solver says is taken
 * on trust.
 */
export function whyNotValid(
  { proposals, reviewers, standing, each }: OptimalInput,
  pairs: readonly { proposal: number; reviewer: number }[],
): string | null {
  const known = new Map(proposals.map((proposal) => [proposal.id, proposal]))
  const made = new Set(standing.map(({ proposal, reviewer }) => `${proposal}:${reviewer}`))
  for (const { proposal: id, reviewer } of pairs) {
    const proposal = known.get(id)
    if (!proposal) return `Proposal ${id} is not on the panel.`
    if (!reviewers.includes(reviewer)) return `Reviewer ${reviewer} is not on the panel.`
    if (proposal.barred.has(reviewer)) return `Reviewer ${reviewer} may not read proposal ${id}.`
    if (made.has(`${id}:${reviewer}`)) return `Reviewer ${reviewer} has proposal ${id} twice.`
    made.add(`${id}:${reviewer}`)
  }
  for (const { id, barred } of proposals) {
    const held = standing.filter((pair) => pair.proposal === id).map((pair) => pair.reviewer)
    const able = reviewers.filter((reviewer) => !barred.has(reviewer) && !held.includes(reviewer)).length
    const wanted = Math.max(0, Math.min(each - held.length, able))
    const given = pairs.filter((pair) => pair.proposal === id).length
    if (given !== wanted) return `Proposal ${id} gets ${given} readers where ${wanted} are wanted.`
  }
  return null
}
