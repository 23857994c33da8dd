import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { optimalAssignments } from '@/lib/panel/assignment/optimalAssignments'
import type { OptimalAssignments, OptimalInput } from '@/lib/panel/assignment/optimalTypes'
import { whyNotValid } from '@/lib/panel/assignment/whyNotValid'
import type { Pairing } from '@/lib/panel/assignment/types'
import type { Solve } from '@/lib/panel/solver/types'
import { seededUniform } from '@/lib/panel/random'
import { solveInWorker } from '@/lib/services/solver/solveInWorker'
import { everyAssignment } from '../support/everyAssignment'

interface Made {
  seed: number
  proposals: number
  reviewers: number
  each: number
  barredShare: number
  levels: number
  standing?: Pairing[]
}

const range = (n: number) => Array.from({ length: n }, (_, i) => i + 1)

/** A panel from a seed; affinities in steps of one over `levels`. */
function made({ seed, proposals, reviewers, each, barredShare, levels, standing = [] }: Made): OptimalInput {
  const random = seededUniform(seed)
  const ids = range(reviewers)
  const of = new Map<string, number>()
  for (const proposal of range(proposals))
    for (const reviewer of ids)
      of.set(`${proposal}:${reviewer}`, Math.round(random() * levels) / Math.max(1, levels))
  return {
    proposals: range(proposals).map((id) => ({
      id,
      pages: 4 + Math.floor(random() * 8),
      barred: new Set(ids.filter(() => random() < barredShare)),
    })),
    reviewers: ids,
    standing,
    each,
    affinity: (proposal, reviewer) => of.get(`${proposal}:${reviewer}`) ?? 0,
    seconds: 20,
  }
}

async function solved(input: OptimalInput): Promise<OptimalAssignments> {
  const answer = await optimalAssignments(input, solveInWorker)
  if ('why' in answer) throw new Error(answer.why)
  return answer
}

describe.each(range(10))('a small panel, seed %i, against every assignment there is', (seed) => {
  const input = made({ seed, proposals: 4, reviewers: 5, each: 2, barredShare: 0.2, levels: 10 })

  it('leaves the range of loads least, then serves the worst best, then has the largest sum', async () => {
    const answer = await solved(input)
    const range = { mean: answer.meanPages, tolerance: answer.tolerancePages }
    const every = everyAssignment(input, range)
    const outside = Math.min(...every.map((one) => one.outsidePages))
    const worst = Math.max(...every.filter((one) => one.outsidePages === outside).map((one) => one.worst))
    const best = every.filter((one) => one.outsidePages === outside && one.worst > worst - 1e-9)
    const linked = best.filter((one) => one.isLinked && one.idle === 0)
    expect(answer.sum.value).toBeLessThanOrEqual(answer.sum.bound + 1e-9)
    expect(answer.worst.value).toBeLessThanOrEqual(answer.worst.bound + 1e-9)
    if (linked.length === 0) return expect(best.every((one) => one.idle > 0 || !one.isLinked)).toBe(true)
    expect(answer.groups).toBe(1)
    expect(answer.outside.reduce((sum, { byPages }) => sum + byPages, 0)).toBeCloseTo(outside, 9)
    expect(answer.worst.value).toBeCloseTo(worst, 9)
    const sum = (of: typeof best) => Math.max(...of.map((one) => one.sum))
    expect(answer.sum.value).toBeGreaterThan(sum(linked) - 1e-4)
    expect(answer.sum.value).toBeLessThan(sum(best) + 1e-9)
  })
})

it('makes no barred pair, gives what can be given, and the same twice', async () => {
  await fc.assert(
    fc.asyncProperty(
      fc.record({
        seed: fc.nat(1e6),
        proposals: fc.integer({ min: 1, max: 12 }),
        reviewers: fc.integer({ min: 1, max: 8 }),
        each: fc.integer({ min: 1, max: 4 }),
        barredShare: fc.constantFrom(0, 0.3, 0.8),
        levels: fc.constantFrom(0, 2, 100),
      }),
      async (shape) => {
        const input = made(shape)
        const answer = await solved(input)
        expect(whyNotValid(input, answer.pairs)).toBeNull()
        for (const { proposal, reviewer } of answer.pairs)
          expect(input.proposals.find(({ id }) => id === proposal)?.barred.has(reviewer)).toBe(false)
        const outside = new Set(answer.outside.map(({ reviewer }) => reviewer))
        for (const reviewer of input.reviewers.filter((id) => !outside.has(id))) {
          const load = answer.pairs
            .filter((pair) => pair.reviewer === reviewer)
            .reduce((sum, pair) => sum + (input.proposals[pair.proposal - 1]?.pages ?? 0), 0)
          expect(Math.abs(load - answer.meanPages)).toBeLessThanOrEqual(answer.tolerancePages)
        }
        expect(await solved(made(shape))).toEqual(answer)
      },
    ),
    { numRuns: 15, seed: 41 },
  )
}, 60_000)

it('keeps standing pairs and their seats, also of someone who is not on the list', async () => {
  const standing: Pairing[] = [
    { proposal: 1, reviewer: 3, seat: 'second' },
    { proposal: 2, reviewer: 99, seat: 'first' },
  ]
  const input = made({
    seed: 3,
    proposals: 3,
    reviewers: 5,
    each: 3,
    barredShare: 0,
    levels: 5,
    standing,
  })
  const { pairs } = await solved(input)
  expect(pairs).toHaveLength(7)
  expect(pairs.filter(({ proposal, reviewer }) => proposal === 1 && reviewer === 3)).toEqual([])
  expect(pairs.filter(({ proposal, seat }) => proposal === 1 && seat === 'second')).toEqual([])
  expect(pairs.filter(({ proposal, seat }) => proposal === 2 && seat === 'first')).toEqual([])
})

it('links two halves that would rather keep to themselves', async () => {
  const half = (id: number) => (id % 2 === 0 ? 1 : 0)
  const proposals = range(6).map((id) => ({ id, pages: 5, barred: new Set<number>() }))
  const input: OptimalInput = {
    proposals,
    reviewers: range(4),
    standing: [],
    each: 2,
    affinity: (proposal, reviewer) => (half(proposal) === half(reviewer) ? 1 : 0.5),
    seconds: 20,
  }
  const answer = await solved(input)
  expect(answer.groups).toBe(1)
  expect(answer.whyNotLinked).toBeNull()
  // Apart, every proposal would have 2; linked, one has 1.5 and the loads stay as they were.
  expect(answer.worst).toEqual({ value: 1.5, bound: 2 })
})

it('says why reviewers cannot be linked', async () => {
  const proposals = [
    { id: 1, pages: 5, barred: new Set([3, 4]) },
    { id: 2, pages: 5, barred: new Set([1, 2]) },
  ]
  const input = { proposals, reviewers: range(4), standing: [], each: 2, affinity: () => 1, seconds: 20 }
  expect(await solved(input)).toMatchObject({
    groups: 2,
    whyNotLinked: 'The interests and the number of readers leave no proposal that both groups could share.',
  })
})

it('names what lacks readers and who reads more than the range', async () => {
  const proposals = range(4).map((id) => ({ id, pages: 10, barred: new Set(id === 4 ? [1, 2, 3] : [2, 3]) }))
  const input = { proposals, reviewers: range(3), standing: [], each: 2, affinity: () => 1, seconds: 20 }
  const answer = await solved({ ...input, tolerancePages: 5 })
  expect(answer.short).toEqual([
    { proposal: 1, lacking: 1 },
    { proposal: 2, lacking: 1 },
    { proposal: 3, lacking: 1 },
    { proposal: 4, lacking: 2 },
  ])
  // The mean is 10 +- 5: one reads thirty pages, the others none.
  expect(answer.outside).toEqual([
    { reviewer: 1, pages: 30, byPages: 15 },
    { reviewer: 2, pages: 0, byPages: 5 },
    { reviewer: 3, pages: 0, byPages: 5 },
  ])
  // Unless told, the range is as wide as the longest proposal: ten pages either way.
  expect((await solved(input)).outside).toEqual([{ reviewer: 1, pages: 30, byPages: 10 }])
})

it('passes on why the solver has no answer', async () => {
  const none: Solve = async () => ({
    status: 'failed',
    values: null,
    why: 'The solver could not be run: gone',
  })
  const input = made({ seed: 1, proposals: 3, reviewers: 4, each: 2, barredShare: 0, levels: 3 })
  expect(await optimalAssignments(input, none)).toEqual({ why: 'The solver could not be run: gone' })
})
