import type { AssignmentDesk } from './assignmentProgramme'
import type { Candidate } from './candidatePairs'

/**
 * Who reads what while pairs are exchanged. A place stands for a pair, `proposal * width + reviewer` in the desk's
 * order; the arrays have one value a place.
 */
export interface SwapDesk {
  width: number
  candidates: readonly (Candidate | undefined)[]
  affinity: Float64Array
  pages: Float64Array
  /** 1 where the pair may be made and is not. */
  isOpen: Uint8Array
  /** Places of the pairs that are made; exchanged in place. */
  seats: number[]
  take: (place: number) => void
  leave: (place: number) => void
  /** What it brings to change the affinity that the proposal of a place has from its readers. */
  servedGain: (place: number, change: number) => number
  /** What it brings to change a reviewer's pages. */
  loadGain: (reviewer: number, change: number) => number
}

export function swapDesk(
  desk: AssignmentDesk,
  chosen: readonly Candidate[],
  price: { floor: number; floorCost: number; pageCost: number },
): SwapDesk {
  const { demands, reviewers, leastPages, mostPages } = desk
  const width = reviewers.length
  const size = demands.length * width
  const rowOf = new Map(demands.map(({ proposal }, row) => [proposal.id, row * width]))
  const placeIn = new Map(reviewers.map((id, place) => [id, place]))
  const placeOf = ({ proposal, reviewer }: Candidate) =>
    (rowOf.get(proposal) ?? 0) + (placeIn.get(reviewer) ?? 0)
  const candidates = Array.from<Candidate | undefined>({ length: size })
  const [affinity, pages, isOpen] = [new Float64Array(size), new Float64Array(size), new Uint8Array(size)]
  for (const [row, { proposal }] of demands.entries())
    pages.fill(proposal.pages, row * width, (row + 1) * width)
  for (const candidate of desk.candidates) {
    const place = placeOf(candidate)
    candidates[place] = candidate
    affinity[place] = candidate.affinity
    isOpen[place] = 1
  }
  const served = Float64Array.from(demands, ({ proposal }) => desk.standingAffinity.get(proposal.id) ?? 0)
  const hasFloor = Uint8Array.from(demands, ({ lacking }) => (lacking === 0 ? 1 : 0))
  const loads = Float64Array.from(reviewers, (id) => desk.standingPages.get(id) ?? 0)
  const put = (place: number, sign: number) => {
    const reviewer = place % width
    const row = (place - reviewer) / width
    isOpen[place] = sign === 1 ? 0 : 1
    served[row] = (served[row] ?? 0) + sign * (affinity[place] ?? 0)
    loads[reviewer] = (loads[reviewer] ?? 0) + sign * (pages[place] ?? 0)
  }
  const seats = chosen.map(placeOf)
  for (const place of seats) put(place, 1)
  const outside = (load: number) => Math.max(0, leastPages - load, load - mostPages)
  return {
    width,
    candidates,
    affinity,
    pages,
    isOpen,
    seats,
    take: (place) => put(place, 1),
    leave: (place) => put(place, -1),
    servedGain: (place, change) => {
      const row = Math.floor(place / width)
      if (hasFloor[row] !== 1) return change
      const now = served[row] ?? 0
      const less = Math.max(0, price.floor - now) - Math.max(0, price.floor - now - change)
      return change + price.floorCost * less
    },
    loadGain: (reviewer, change) => {
      const now = loads[reviewer] ?? 0
      return price.pageCost * (outside(now) - outside(now + change))
    },
  }
}
