import { describe, expect, it } from 'vitest'
import { seededUniform } from '@/lib/panel/random'
import { connectedGroups } from '@/lib/panel/statistics'
import { suggestAssignments } from '@/lib/panel/assignment/suggestAssignments'
import type { Pairing, ToRead } from '@/lib/panel/assignment/types'

const range = (n: number) => Array.from({ length: n }, (_, i) => i + 1)

function made(seed: number): { proposals: ToRead[]; reviewers: number[] } {
  const random = seededUniform(seed)
  const reviewers = range(14)
  return {
    reviewers,
    proposals: range(24).map((id) => ({
      id,
      pages: 4 + Math.floor(random() * 8),
      barred: new Set(reviewers.filter(() => random() < 0.15)),
    })),
  }
}

describe.each(range(12))('suggestion for made panel %i', (seed) => {
  const { proposals, reviewers } = made(seed)
  const { pairs, short } = suggestAssignments({ proposals, reviewers, standing: [], each: 5 })

  it('gives every proposal five readers, none barred, none twice', () => {
    expect(short).toEqual([])
    for (const proposal of proposals) {
      const readers = pairs.filter((pair) => pair.proposal === proposal.id).map((pair) => pair.reviewer)
      expect(new Set(readers).size).toBe(5)
      expect(readers.filter((id) => proposal.barred.has(id))).toEqual([])
    }
  })

  it('spreads pages within one proposal of the mean, and links all reviewers', () => {
    const pages = new Map(proposals.map((proposal) => [proposal.id, proposal.pages]))
    const loads = reviewers.map((id) =>
      pairs.filter((p) => p.reviewer === id).reduce((sum, p) => sum + (pages.get(p.proposal) ?? 0), 0),
    )
    expect(Math.max(...loads) - Math.min(...loads)).toBeLessThanOrEqual(12)
    expect(connectedGroups(pairs)).toHaveLength(1)
  })

  it('gives each proposal one first and one second seat, shared out evenly', () => {
    for (const seat of ['first', 'second'] as const) {
      for (const { id } of proposals)
        expect(pairs.filter((p) => p.proposal === id && p.seat === seat)).toHaveLength(1)
      const counts = reviewers.map((id) => pairs.filter((p) => p.reviewer === id && p.seat === seat).length)
      expect(Math.max(...counts)).toBeLessThanOrEqual(4)
    }
  })
})

it('keeps what stands and adds only what is missing', () => {
  const standing: Pairing[] = [{ proposal: 1, reviewer: 3, seat: 'first' }]
  const { pairs } = suggestAssignments({
    proposals: [{ id: 1, pages: 5, barred: new Set([2]) }],
    reviewers: [1, 2, 3, 4],
    standing,
    each: 3,
  })
  expect(pairs).toEqual([
    { proposal: 1, reviewer: 1, seat: 'second' },
    { proposal: 1, reviewer: 4, seat: 'reader' },
  ])
})

it('says how many readers are lacking where too few may read', () => {
  const proposals = [{ id: 7, pages: 5, barred: new Set([1, 2]) }]
  expect(suggestAssignments({ proposals, reviewers: [1, 2, 3], standing: [], each: 3 })).toEqual({
    pairs: [{ proposal: 7, reviewer: 3, seat: 'first' }],
    short: [{ proposal: 7, lacking: 2 }],
  })
})
