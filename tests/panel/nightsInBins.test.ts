import { describe, expect, it } from 'vitest'
import { BinFlow } from '@/lib/panel/nights/binFlow'
import type { BinnedPart } from '@/lib/panel/nights/binTypes'
import { byRankInBins } from '@/lib/panel/nights/byRankInBins'
import { whyNotInBins } from '@/lib/panel/nights/whyNotInBins'
import { seededUniform } from '@/lib/panel/random'
import { ProgrammeBuilder } from '@/lib/panel/solver/programmeBuilder'
import { solveInWorker } from '@/lib/services/solver/solveInWorker'
import { bin, line, part } from '../support/binnedLines'

const h = 3600
const hours = (plan: { given: { proposal: number; seconds: number }[] }) =>
  plan.given.map(({ proposal, seconds }) => [proposal, seconds / h])

describe('by rank, in bins', () => {
  it('moves those above among their bins to make room for those below', () => {
    // The first could lie in either bin, the second only in the first bin.
    const asked = [[line(1, [part(4, { 0: 4, 1: 4 })])], [line(2, [part(4, { 0: 4 })])]]
    const plan = byRankInBins(asked, [bin(4), bin(4, 1)])
    expect(hours(plan)).toEqual([
      [1, 4],
      [2, 4],
    ])
    expect(plan.given[0]?.laid).toEqual(new Map([[1, 4 * h]]))
  })

  it('never takes from those above, and says what was found', () => {
    const asked = [[line(1, [part(4, { 0: 4 })])], [line(2, [part(4, { 0: 4, 1: 1 })])]]
    const plan = byRankInBins(asked, [bin(4), bin(4, 1)])
    expect(hours(plan)).toEqual([[1, 4]])
    expect(plan.notGiven).toEqual([{ proposal: 2, instrument: 10, reason: 'too-little-left', found: h }])
  })

  it('gives a part where that is of use, in full tenths of an hour', () => {
    const asked = [[line(1, [part(4, { 0: 4 })])], [line(2, [part(5, { 0: 9, 1: 2.57 })])]]
    expect(hours(byRankInBins(asked, [bin(4), bin(4, 1)]))).toEqual([
      [1, 4],
      [2, 2.5],
    ])
  })

  it('tells a target that no night suits from one that came too late, and from one not possible', () => {
    const plan = byRankInBins(
      [
        [line(1, [part(4, { 0: 0.5 })])],
        [line(2, [part(4, { 0: 4 })], { possible: false })],
        [line(3, [part(4, { 0: 4 })])],
      ],
      [bin(4)],
    )
    expect(plan.notGiven.map(({ proposal, reason }) => [proposal, reason])).toEqual([
      [1, 'not-usable'],
      [2, 'not-possible'],
    ])
    expect(hours(plan)).toEqual([[3, 4]])
  })

  it('lays what is given elsewhere first', () => {
    const asked = [[line(1, [part(4, { 0: 4, 1: 1 })])]]
    expect(hours(byRankInBins(asked, [bin(4), bin(4, 1)], [line(9, [part(2, { 0: 4 })])]))).toEqual([[1, 3]])
  })

  it('gives two instruments together or not at all, and leaves the time to others', () => {
    const two = [line(1, [part(3, { 0: 3 })]), line(1, [part(3, { 1: 1 })], { instrument: 20 })]
    const plan = byRankInBins([two, [line(2, [part(4, { 0: 4 })])]], [bin(4), bin(4, 1)])
    expect(hours(plan)).toEqual([[2, 4]])
  })
})

describe('why not', () => {
  it('names what a proposal would displace', () => {
    const asked = [
      [line(1, [part(4, { 0: 4 })])],
      [line(2, [part(4, { 1: 4 })])],
      [line(3, [part(3, { 0: 4 })])],
    ]
    expect(whyNotInBins(asked, [bin(4), bin(4, 1)], [], 3)).toEqual({
      seconds: 3 * h,
      displaced: [{ proposal: 1, instrument: 10, fromSeconds: 4 * h, toSeconds: 0 }],
    })
    expect(whyNotInBins(asked, [bin(1), bin(4, 1)], [], 3)).toBeNull()
  })
})

/** Parts and bins from a seed, the parts asking for more than there is. */
function made(seed: number) {
  const random = seededUniform(seed)
  const seconds = Array.from({ length: 8 }, () => Math.floor(random() * 20_000))
  const parts = Array.from({ length: 14 }, (): BinnedPart => ({
    seconds: 1000 + Math.floor(random() * 15_000),
    usable: new Map(
      seconds.flatMap((most, at) => (random() < 0.35 ? [[at, 1 + Math.floor(random() * most)]] : [])),
    ),
  }))
  return { seconds, parts }
}

describe('independent code: HiGHS, the most that can be laid of one part while those before keep theirs', () => {
  it.each(Array.from({ length: 12 }, (_, i) => i + 1))('season %s', async (seed) => {
    const { seconds, parts } = made(seed)
    const flow = new BinFlow(seconds)
    const found: number[] = []
    for (const [last, one] of parts.entries()) {
      const programme = new ProgrammeBuilder()
      const columns = parts.slice(0, last + 1).map(({ usable }, at) =>
        [...usable].map(([binAt, can]) => ({
          binAt,
          column: programme.column({
            objective: at === last ? 1 : 0,
            lower: 0,
            upper: can,
            isInteger: false,
          }),
        })),
      )
      columns.forEach((own, at) => {
        const most = at === last ? one.seconds : (found[at] ?? 0)
        programme.row(
          at === last ? 0 : most,
          most,
          own.map(({ column }) => [column, 1] as const),
        )
      })
      seconds.forEach((most, binAt) => {
        const here = columns.flat().filter((entry) => entry.binAt === binAt)
        programme.row(
          -Infinity,
          most,
          here.map(({ column }) => [column, 1] as const),
        )
      })
      const answer = await solveInWorker(programme.build(), { seconds: 10, relativeGap: 0 })
      found.push(flow.secondsOf(flow.lay(one)))
      expect(answer.values === null ? answer.why : answer.objective).toBeCloseTo(found[last] ?? NaN, 3)
    }
    for (const [at] of seconds.entries()) {
      const laid = parts.reduce((sum, _, node) => sum + (flow.laidOf(node).get(at) ?? 0), 0)
      expect(laid).toBeLessThanOrEqual(seconds[at] ?? 0)
    }
    parts.forEach(({ usable }, node) => {
      for (const [at, laid] of flow.laidOf(node)) expect(laid).toBeLessThanOrEqual(usable.get(at) ?? 0)
    })
  })
})
