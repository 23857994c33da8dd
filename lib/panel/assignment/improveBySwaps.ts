import type { AssignmentDesk } from './assignmentProgramme'
import type { Candidate } from './candidatePairs'
import { swapDesk, type SwapDesk } from './swapDesk'

/** After so many rounds a search that still finds something finds little. */
const MOST_ROUNDS = 12
const EPSILON = 1e-9

/**
 * Improves whole pairs one exchange at a time until no exchange helps: a reader for another, or two proposals trading
 * a reader each. Counted is the sum of affinities, less each page outside the range of loads at `pageCost`, less what
 * proposals lack to `floor` at `floorCost`. Same input, same answer.
 */
export function improveBySwaps(
  desk: AssignmentDesk,
  chosen: readonly Candidate[],
  price: { floor: number; floorCost: number; pageCost: number },
): Candidate[] {
  const table = swapDesk(desk, chosen, price)
  const count = table.seats.length
  for (let round = 0, found = true; found && round < MOST_ROUNDS; round += 1) {
    found = false
    for (let i = 0; i < count; i += 1) {
      if (replace(table, i)) found = true
      for (let j = i + 1; j < count; j += 1) if (trade(table, i, j)) found = true
    }
  }
  return table.seats.flatMap((place) => table.candidates[place] ?? [])
}

/** Gives a seat to whoever gains the most by it. */
function replace(table: SwapDesk, i: number): boolean {
  const { seats, width, affinity, pages, isOpen } = table
  const place = seats[i] ?? 0
  const r = place % width
  const first = place - r
  const own = pages[place] ?? 0
  const freed = table.loadGain(r, -own)
  let best = EPSILON
  let taker = -1
  for (let other = first; other < first + width; other += 1) {
    if (isOpen[other] !== 1) continue
    const change = (affinity[other] ?? 0) - (affinity[place] ?? 0)
    const gain = table.servedGain(place, change) + freed + table.loadGain(other - first, own)
    if (gain <= best) continue
    best = gain
    taker = other
  }
  if (taker < 0) return false
  table.leave(place)
  table.take(taker)
  seats[i] = taker
  return true
}

/** Lets two proposals trade a reader each, if that gains anything. */
function trade(table: SwapDesk, i: number, j: number): boolean {
  const { seats, width, affinity, pages, isOpen } = table
  const one = seats[i] ?? 0
  const other = seats[j] ?? 0
  const [r, s] = [one % width, other % width]
  const [crossed, back] = [one - r + s, other - s + r]
  if (isOpen[crossed] !== 1 || isOpen[back] !== 1) return false
  const shift = (pages[other] ?? 0) - (pages[one] ?? 0)
  const gain =
    table.servedGain(one, (affinity[crossed] ?? 0) - (affinity[one] ?? 0)) +
    table.servedGain(other, (affinity[back] ?? 0) - (affinity[other] ?? 0)) +
    (shift === 0 ? 0 : table.loadGain(r, shift) + table.loadGain(s, -shift))
  if (gain <= EPSILON) return false
  for (const place of [one, other]) table.leave(place)
  for (const place of [crossed, back]) table.take(place)
  seats[i] = crossed
  seats[j] = back
  return true
}
