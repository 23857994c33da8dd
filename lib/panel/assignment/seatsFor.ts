import type { Pairing, Seat } from './types'

/**
 * Who opens the discussion of each proposal (first), who speaks second, who reads: seats already given stay, open ones
 * go to the reader with the fewest of that seat so far.
 */
export function seatsFor(
  readers: ReadonlyMap<number, readonly number[]>,
  standing: readonly Pairing[],
): Pairing[] {
  const held = new Map(standing.map((pair) => [`${pair.proposal}:${pair.reviewer}`, pair.seat]))
  const count = new Map<string, number>()
  const counted = (reviewer: number, seat: Seat) => count.get(`${reviewer}:${seat}`) ?? 0
  const give = (reviewer: number, seat: Seat) => count.set(`${reviewer}:${seat}`, counted(reviewer, seat) + 1)
  for (const { reviewer, seat } of standing) give(reviewer, seat)

  const pairs: Pairing[] = []
  for (const [proposal, all] of [...readers].sort(([a], [b]) => a - b)) {
    const seats = new Map<number, Seat>()
    for (const reviewer of all) {
      const seat = held.get(`${proposal}:${reviewer}`)
      if (seat) seats.set(reviewer, seat)
    }
    for (const seat of ['first', 'second'] as const) {
      if ([...seats.values()].includes(seat)) continue
      const [chosen] = all
        .filter((reviewer) => !seats.has(reviewer))
        .sort((a, b) => counted(a, seat) - counted(b, seat) || a - b)
      if (chosen === undefined) continue
      seats.set(chosen, seat)
      give(chosen, seat)
    }
    for (const reviewer of all) pairs.push({ proposal, reviewer, seat: seats.get(reviewer) ?? 'reader' })
  }
  return pairs
}
