import { describe, expect, it } from 'vitest'
import { assignmentDesk } from '@/lib/panel/assignment/assignmentDesk'
import { improveBySwaps } from '@/lib/panel/assignment/improveBySwaps'
import { optimalAssignments } from '@/lib/panel/assignment/optimalAssignments'
import { seededUniform } from '@/lib/panel/random'
import { whyNotValid } from '@/lib/panel/assignment/whyNotValid'
import { solveInWorker } from '@/lib/services/solver/solveInWorker'

const ids = (count: number) => Array.from({ length: count }, (_, i) => i + 1)

/** Each reviewer knows two of seven fields: most pairs have no affinity at all. */
function fieldsOfFew(proposals: number, reviewers: number) {
  const random = seededUniform(41)
  const field = ids(proposals).map(() => Math.floor(random() * 7))
  const level = ids(reviewers).map((id) => {
    const own = Array.from({ length: 7 }, () => 0)
    own[id % 7] = 0.75
    own[Math.floor(random() * 7)] ||= 0.5
    return own
  })
  return {
    proposals: ids(proposals).map((id) => ({
      id,
      pages: 4 + Math.floor(random() * 8),
      barred: new Set(ids(reviewers).filter(() => random() < 0.1)),
    })),
    reviewers: ids(reviewers),
    standing: [],
    each: 3,
    affinity: (proposal: number, reviewer: number) => level[reviewer - 1]?.[field[proposal - 1] ?? 0] ?? 0,
    seconds: 8,
  }
}

describe('a large panel whose reviewers know little of most', () => {
  // Branch and bound alone gave the worst served 0.5 of a bound of 1.3, on such a panel of 300 proposals and 60 reviewers.
  it('comes near what no assignment can exceed, with all loads in range', async () => {
    const input = fieldsOfFew(90, 20)
    const answer = await optimalAssignments(input, solveInWorker)
    if ('why' in answer) throw new Error(answer.why)
    expect(answer.outside).toEqual([])
    expect(answer.worst.value).toBeLessThanOrEqual(answer.worst.bound + 1e-6)
    expect(answer.worst.value).toBeGreaterThan(0.8 * answer.worst.bound)
    expect(answer.sum.value).toBeLessThanOrEqual(answer.sum.bound + 1e-6)
    expect(answer.sum.value).toBeGreaterThan(0.95 * answer.sum.bound)
    expect(whyNotValid(input, answer.pairs)).toBeNull()
  }, 60_000)
})

describe('exchanging readers', () => {
  const price = { floor: 0, floorCost: 10, pageCost: 4 }

  it('never makes it worse, makes no barred pair, and ends the same twice', () => {
    const input = fieldsOfFew(40, 16)
    const desk = assignmentDesk(input)
    const dealt = desk.demands.flatMap(({ proposal }) =>
      desk.candidates.filter((pair) => pair.proposal === proposal.id).slice(0, 3),
    )
    const value = (pairs: readonly { affinity: number; proposal: number; reviewer: number }[]) => {
      const pagesOf = new Map(input.proposals.map(({ id, pages }) => [id, pages]))
      return input.reviewers.reduce(
        (sum, id) => {
          const load = pairs.reduce(
            (pages, pair) => pages + (pair.reviewer === id ? (pagesOf.get(pair.proposal) ?? 0) : 0),
            0,
          )
          return sum - 4 * Math.max(0, desk.leastPages - load, load - desk.mostPages)
        },
        pairs.reduce((sum, { affinity }) => sum + affinity, 0),
      )
    }
    const better = improveBySwaps(desk, dealt, price)
    expect(value(better)).toBeGreaterThan(value(dealt))
    expect(whyNotValid(input, better)).toBeNull()
    expect(improveBySwaps(desk, dealt, price)).toEqual(better)
  })

  it('trades where no single reader can be replaced', () => {
    // Two proposals, two reviewers with room for one each: each reads what the other knows.
    const input = {
      proposals: ids(2).map((id) => ({ id, pages: 10, barred: new Set<number>() })),
      reviewers: [1, 2],
      standing: [],
      each: 1,
      affinity: (proposal: number, reviewer: number) => (proposal === reviewer ? 1 : 0),
      tolerancePages: 0,
      seconds: 1,
    }
    const desk = assignmentDesk(input)
    const crossed = desk.candidates.filter(({ proposal, reviewer }) => proposal !== reviewer)
    expect(improveBySwaps(desk, crossed, price).map(({ affinity }) => affinity)).toEqual([1, 1])
  })
})
