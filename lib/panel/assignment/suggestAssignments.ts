import { seatsFor } from './seatsFor'
import type { Pairing, ToRead } from './types'

export interface SuggestionInput {
  proposals: readonly ToRead[]
  reviewers: readonly number[]
  /** Pairs that stand already; they are kept. */
  standing: readonly Pairing[]
  /** Readers wanted for each proposal. */
  each: number
}

export interface Suggestion {
  pairs: Pairing[]
  /** Proposals that cannot have as many readers as wanted, with how many they lack. */
  short: { proposal: number; lacking: number }[]
}

const key = (a: number, b: number) => (a < b ? `${a}:${b}` : `${b}:${a}`)

/**
 * A balanced suggestion: the proposal with the fewest readers to choose from is served first, by the reader with the
 * fewest pages; among equals, by the one who shares the fewest proposals with its other readers, so that all reviewers
 * end up linked. A barred pair is never made. Same input, same answer.
 */
export function suggestAssignments({ proposals, reviewers, standing, each }: SuggestionInput): Suggestion {
  const pagesOf = new Map(proposals.map(({ id, pages }) => [id, pages]))
  const load = new Map(reviewers.map((id) => [id, 0]))
  const readers = new Map<number, number[]>(proposals.map(({ id }) => [id, []]))
  const shared = new Map<string, number>()
  const seat = (proposal: number, reviewer: number) => {
    const others = readers.get(proposal) ?? []
    for (const other of others) shared.set(key(other, reviewer), (shared.get(key(other, reviewer)) ?? 0) + 1)
    readers.set(proposal, [...others, reviewer])
    load.set(reviewer, (load.get(reviewer) ?? 0) + (pagesOf.get(proposal) ?? 0))
  }
  for (const { proposal, reviewer } of standing) if (readers.has(proposal)) seat(proposal, reviewer)

  const free = (proposal: ToRead) =>
    reviewers.filter((id) => !proposal.barred.has(id) && !readers.get(proposal.id)?.includes(id))
  const wanted = (proposal: ToRead) => Math.max(0, each - (readers.get(proposal.id)?.length ?? 0))
  const short: Suggestion['short'] = []
  let open = proposals.filter((proposal) => wanted(proposal) > 0)
  while (open.length > 0) {
    const slack = (proposal: ToRead) => free(proposal).length - wanted(proposal)
    const [next] = [...open].sort(
      (a, b) => slack(a) - slack(b) || wanted(b) - wanted(a) || b.pages - a.pages || a.id - b.id,
    )
    if (!next) break
    const links = (id: number) =>
      (readers.get(next.id) ?? []).reduce((sum, other) => sum + (shared.get(key(other, id)) ?? 0), 0)
    const [reader] = free(next).sort(
      (a, b) => (load.get(a) ?? 0) - (load.get(b) ?? 0) || links(a) - links(b) || a - b,
    )
    if (reader === undefined) short.push({ proposal: next.id, lacking: wanted(next) })
    else seat(next.id, reader)
    open = open.filter(
      (proposal) => (proposal.id === next.id ? reader !== undefined : true) && wanted(proposal) > 0,
    )
  }
  const standingKeys = new Set(standing.map(({ proposal, reviewer }) => `${proposal}:${reviewer}`))
  const pairs = seatsFor(readers, standing).filter(
    ({ proposal, reviewer }) => !standingKeys.has(`${proposal}:${reviewer}`),
  )
  return { pairs, short: short.sort((a, b) => a.proposal - b.proposal) }
}
