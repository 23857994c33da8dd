import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { mergeByShare } from '@/lib/panel/sharing/mergeByShare'
import { moveBetween } from '@/lib/panel/sharing/moveBetween'
import { nearLines } from '@/lib/panel/sharing/nearLines'
import { sharesOf } from '@/lib/panel/sharing/sharesOf'
import type { Claim, RankedList, Share } from '@/lib/panel/sharing/types'

// Seen to fail: shares cut down without giving out the rest, equal parts ordered by panel alone, what is used counted
// without the proposal itself, and a move that leaves behind those of its own panel.

const claim = (panel: number, pool: number, seconds: number, proposals = 1): Claim => ({
  ...{ panel, pool, seconds, proposals },
})
const secondsOf = (shares: readonly Share[], pool = 1) =>
  shares.filter((share) => share.pool === pool).map(({ seconds }) => seconds)

describe('shares of a pool', () => {
  const panels = [1, 2, 3]
  const claims = [claim(1, 1, 60, 1), claim(2, 1, 30, 2), claim(3, 1, 10, 1)]
  const pools = [{ id: 1, seconds: 50 }]

  it('go by hours asked, by number, or as written', () => {
    expect(secondsOf(sharesOf({ rule: 'hours', pools, panels, claims }))).toEqual([30, 15, 5])
    expect(secondsOf(sharesOf({ rule: 'proposals', pools, panels, claims }))).toEqual([13, 25, 12])
    const percents = new Map([
      [1, 50],
      [2, 25],
      [3, 25],
    ])
    expect(secondsOf(sharesOf({ rule: 'fixed', pools, panels, claims, percents }))).toEqual([25, 13, 12])
  })

  // Worked by hand: quotas of 10 seats for 43, 31 and 26 votes are 4.3, 3.1 and 2.6; the seat left goes to the third.
  it('give what is left to the largest remainders', () => {
    const votes = [claim(1, 1, 43), claim(2, 1, 31), claim(3, 1, 26)]
    expect(
      secondsOf(sharesOf({ rule: 'hours', pools: [{ id: 1, seconds: 10 }], panels, claims: votes })),
    ).toEqual([4, 3, 3])
  })

  it('of a pool nobody asks for are nothing, and of one panel the whole', () => {
    expect(secondsOf(sharesOf({ rule: 'hours', pools, panels, claims: [] }))).toEqual([0, 0, 0])
    expect(secondsOf(sharesOf({ rule: 'hours', pools, panels, claims: [claim(2, 1, 7)] }))).toEqual([
      0, 50, 0,
    ])
  })

  it('add up to the whole of every pool, each within a second of its quota', () => {
    const amount = fc.integer({ min: 0, max: 3_000_000 })
    fc.assert(
      fc.property(
        fc.array(amount, { minLength: 1, maxLength: 6 }),
        fc.integer({ min: 0, max: 20_000_000 }),
        (asked, seconds) => {
          const all = asked.reduce((sum, one) => sum + one, 0)
          const shares = secondsOf(
            sharesOf({
              rule: 'hours',
              pools: [{ id: 1, seconds }],
              panels: asked.map((_, index) => index),
              claims: asked.map((one, index) => claim(index, 1, one)),
            }),
          )
          expect(shares.reduce((sum, one) => sum + one, 0)).toBe(all === 0 ? 0 : seconds)
          asked.forEach((one, index) => {
            if (all > 0) expect(Math.abs((shares[index] ?? 0) - (seconds * one) / all)).toBeLessThan(1)
          })
        },
      ),
    )
  })
})

const list = (panel: number, asked: readonly (readonly [pool: number, seconds: number][])[]): RankedList => ({
  panel,
  proposals: asked.map((lines, index) => ({
    id: panel * 100 + index + 1,
    asked: lines.map(([pool, seconds]) => ({ pool, seconds })),
  })),
})
const share = (panel: number, seconds: number, pool = 1): Share => ({ panel, pool, seconds })

describe('the merged order', () => {
  it('goes by the part of the share that is used with each', () => {
    const merged = mergeByShare(
      [list(1, [[[1, 10]], [[1, 30]], [[1, 10]]]), list(2, [[[1, 10]], [[1, 10]]])],
      [share(1, 40), share(2, 10)],
    )
    expect(merged.map(({ proposal, used }) => [proposal, used])).toEqual([
      [101, 0.25],
      // As much of its share as the next, and the higher rank.
      [201, 1],
      [102, 1],
      [103, 1.25],
      [202, 2],
    ])
  })

  it('puts the higher rank first where two are equal, then the panel that stands first', () => {
    const equal = mergeByShare(
      [list(1, [[[1, 5]], [[1, 5]]]), list(2, [[[1, 10]]])],
      [share(1, 10), share(2, 10)],
    )
    expect(equal.map(({ proposal }) => proposal)).toEqual([101, 201, 102])
    const ranks = mergeByShare([list(2, [[[1, 1]]]), list(1, [[[1, 1]]])], [share(1, 2), share(2, 2)])
    expect(ranks.map(({ proposal }) => proposal)).toEqual([201, 101])
  })

  it('takes the tightest of several pools, and puts those without a share last', () => {
    const merged = mergeByShare(
      [list(1, [[[1, 5]], [[2, 9]], [[1, 1]]]), list(2, [[[1, 8]], [[3, 1]]])],
      [share(1, 10), share(2, 10), share(1, 10, 2)],
    )
    expect(merged.map(({ proposal, used }) => [proposal, used])).toEqual([
      [101, 0.5],
      [201, 0.8],
      [102, 0.9],
      [103, 0.9],
      [202, Infinity],
    ])
  })

  it('goes by rank alone where nothing is asked', () => {
    const merged = mergeByShare([list(1, [[], []]), list(2, [[]])], [])
    expect(merged.map(({ proposal }) => proposal)).toEqual([101, 201, 102])
  })

  it('leaves out a panel with no proposals', () => {
    expect(mergeByShare([list(1, []), list(2, [[[1, 1]]])], [share(2, 1)])).toHaveLength(1)
  })
})

const seconds = fc.integer({ min: 0, max: 8 })
const lines = fc.array(fc.tuple(fc.integer({ min: 1, max: 2 }), seconds), { maxLength: 2 })
const asked = fc.array(lines, { maxLength: 4 })
const game = fc.record({
  lists: fc.array(asked, { minLength: 1, maxLength: 3 }),
  shares: fc.array(seconds, { minLength: 6, maxLength: 6 }),
})
const built = ({ lists, shares }: { lists: [number, number][][][]; shares: number[] }) => ({
  lists: lists.map((one, index) => list(index + 1, one)),
  shares: lists.flatMap((_, index) => [
    share(index + 1, shares[2 * index] ?? 0, 1),
    share(index + 1, shares[2 * index + 1] ?? 0, 2),
  ]),
})

/** Every order of all proposals in which each list keeps its own. */
function interleavings(lists: readonly (readonly number[])[]): number[][] {
  if (lists.every((one) => one.length === 0)) return [[]]
  return lists.flatMap((one, index) => {
    const [first, ...rest] = one
    if (first === undefined) return []
    return interleavings(lists.map((other, at) => (at === index ? rest : other))).map((tail) => [
      first,
      ...tail,
    ])
  })
}

/** A part of a share as a fraction, so that no rounding decides; a share of nothing stands for infinity. */
type Part = readonly [over: bigint, under: bigint]
const compare = (a: Part, b: Part): number => {
  if (a[1] === 0n || b[1] === 0n) return Number(a[1] === 0n) - Number(b[1] === 0n)
  const left = a[0] * b[1]
  const right = b[0] * a[1]
  return left === right ? 0 : left < right ? -1 : 1
}
function partsOf(one: RankedList, shares: readonly Share[]): Part[] {
  return one.proposals.map((_, last) => {
    let most: Part = [0n, 1n]
    for (const pool of [1, 2]) {
      const sum = one.proposals
        .slice(0, last + 1)
        .flatMap((proposal) => proposal.asked)
        .reduce((total, line) => total + (line.pool === pool ? line.seconds : 0), 0)
      const own = shares.find((held) => held.panel === one.panel && held.pool === pool)?.seconds ?? 0
      if (sum > 0 && compare([BigInt(sum), BigInt(own)], most) > 0) most = [BigInt(sum), BigInt(own)]
    }
    return most
  })
}

describe('whatever is asked', () => {
  it('the order within a panel never changes, and what is used never falls', () => {
    fc.assert(
      fc.property(game, (given) => {
        const { lists, shares } = built(given as never)
        const merged = mergeByShare(lists, shares)
        for (const one of lists)
          expect(merged.filter(({ panel }) => panel === one.panel).map(({ proposal }) => proposal)).toEqual(
            one.proposals.map(({ id }) => id),
          )
        for (const [index, { used }] of merged.entries())
          if (index > 0) expect(used >= (merged[index - 1]?.used ?? 0)).toBe(true)
      }),
    )
  })

  it('the order is the first of all interleavings, in exact fractions', () => {
    fc.assert(
      fc.property(game, (given) => {
        const { lists, shares } = built(given as never)
        const facts = new Map(
          lists.flatMap((one, at) => {
            const parts = partsOf(one, shares)
            return one.proposals.map(
              ({ id }, index) => [id, { part: parts[index] as Part, rank: index, at }] as const,
            )
          }),
        )
        const before = (a: number[], b: number[]): number => {
          for (const [index, id] of a.entries()) {
            const x = facts.get(id)
            const y = facts.get(b[index] ?? 0)
            if (!x || !y || x === y) continue
            return compare(x.part, y.part) || x.rank - y.rank || x.at - y.at
          }
          return 0
        }
        const [best] = interleavings(lists.map((one) => one.proposals.map(({ id }) => id))).sort(before)
        expect(mergeByShare(lists, shares).map(({ proposal }) => proposal)).toEqual(best)
      }),
      { numRuns: 60 },
    )
  })
})

describe('near the lines', () => {
  const near = (lists: RankedList[], shares: Share[]) => {
    const merged = mergeByShare(lists, shares)
    const marks = nearLines(merged)
    return merged.filter((_, index) => marks[index]).map(({ proposal }) => proposal)
  }

  it('stand those that use three to five quarters of a share, and what lies between them', () => {
    const one = list(1, [[[1, 5]], [[1, 3]], [[1, 3]], [[1, 9]]])
    expect(near([one], [share(1, 10)])).toEqual([102, 103])
  })

  it('stand the last above and the first below a line, however far', () => {
    const one = list(1, [[[1, 1]], [[1, 4]], [[1, 15]], [[1, 1]]])
    expect(near([one], [share(1, 10)])).toEqual([102, 103])
  })

  it('stands none where no line cuts a list', () => {
    expect(near([list(1, [[[1, 1]], [[1, 1]]])], [share(1, 10)])).toEqual([])
    expect(nearLines([])).toEqual([])
  })
})

describe('moving at the meeting', () => {
  const panelOf = (id: number) => Math.floor(id / 100)
  const order = [101, 201, 102, 202, 203, 103]

  it('takes the place of another', () => {
    expect(moveBetween(order, panelOf, 202, 102)).toEqual([101, 201, 202, 102, 203, 103])
    expect(moveBetween(order, panelOf, 201, 102)).toEqual([101, 102, 201, 202, 203, 103])
  })

  it('takes along those of its own panel that it passes', () => {
    expect(moveBetween(order, panelOf, 202, 101)).toEqual([201, 202, 101, 102, 203, 103])
    expect(moveBetween(order, panelOf, 201, 203)).toEqual([101, 102, 201, 202, 203, 103])
  })

  it('leaves the order alone where there is nothing to move', () => {
    expect(moveBetween(order, panelOf, 101, 101)).toEqual(order)
    expect(moveBetween(order, panelOf, 999, 101)).toEqual(order)
    expect(moveBetween(order, panelOf, 101, 999)).toEqual(order)
  })

  it('keeps everyone, and each panel’s own order', () => {
    fc.assert(
      fc.property(fc.constantFrom(...order), fc.constantFrom(...order), (id, to) => {
        const next = moveBetween(order, panelOf, id, to)
        for (const panel of [1, 2])
          expect(next.filter((one) => panelOf(one) === panel)).toEqual(
            order.filter((one) => panelOf(one) === panel),
          )
        expect([...next].sort()).toEqual([...order].sort())
      }),
    )
  })
})
