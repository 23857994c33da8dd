import { describe, expect, it } from 'vitest'
import type { BinnedLine } from '@/lib/panel/nights/binTypes'
import { byRankInBins } from '@/lib/panel/nights/byRankInBins'
import { mostMeritInBins, type MeritInput } from '@/lib/panel/nights/mostMeritInBins'
import { seededUniform } from '@/lib/panel/random'
import { solveInWorker } from '@/lib/services/solver/solveInWorker'
import { bin, line, part } from '../support/binnedLines'

const h = 3600
const limits = { seconds: 20, relativeGap: 1e-6 }
async function solved(input: Omit<MeritInput, 'standing'> & { standing?: BinnedLine[] }) {
  const plan = await mostMeritInBins({ standing: [], ...input }, solveInWorker, limits)
  if ('why' in plan) throw new Error(plan.why)
  return plan
}
const hours = (plan: { given: { proposal: number; seconds: number }[] }) =>
  Object.fromEntries(plan.given.map(({ proposal, seconds }) => [proposal, seconds / h]))

describe('most merit above the line', () => {
  it('passes over a greedy first for two that together are worth more', async () => {
    const asked = [
      [line(1, [part(10, { 0: 10 })], { least: 8 * h })],
      [line(2, [part(5, { 0: 10 })])],
      [line(3, [part(5, { 0: 10 })])],
    ]
    const merit = new Map([
      [1, 7],
      [2, 7.5],
      [3, 7],
    ])
    const plan = await solved({ asked, line: 3, bins: [bin(10)], merit })
    expect(hours(plan)).toEqual({ 2: 5, 3: 5 })
    expect(plan.meritHours).toBeCloseTo(72.5, 9)
    expect(hours(byRankInBins(asked, [bin(10)]))).toEqual({ 1: 10 })
    expect(plan.notGiven).toMatchObject([{ proposal: 1, reason: 'too-little-left' }])
  })

  it('leaves those below the line what remains', async () => {
    const asked = [
      [line(1, [part(4, { 0: 10 })])],
      [line(2, [part(9, { 0: 10 })])],
      [line(3, [part(3, { 0: 10 })])],
    ]
    const merit = new Map([
      [1, 5],
      [2, 9],
      [3, 9],
    ])
    const plan = await solved({ asked, line: 1, bins: [bin(10)], merit })
    expect(hours(plan)).toEqual({ 1: 4, 2: 6 })
    expect(plan.meritHours).toBeCloseTo(20, 9)
  })

  it('keeps what is given elsewhere, and gives nothing to what is not possible', async () => {
    const asked = [[line(1, [part(4, { 0: 10 })], { possible: false })], [line(2, [part(9, { 0: 10 })])]]
    const merit = new Map([
      [1, 9],
      [2, 8],
    ])
    const standing = [line(9, [part(3, { 0: 3 })])]
    const plan = await solved({ asked, line: 2, bins: [bin(10)], merit, standing })
    expect(hours(plan)).toEqual({ 2: 7 })
    expect(plan.notGiven).toMatchObject([{ proposal: 1, reason: 'not-possible' }])
  })

  it('begins with whom the ranking gives time, and ends where it should all the same', async () => {
    const asked = [
      [line(1, [part(10, { 0: 10 })], { least: 8 * h })],
      [line(2, [part(5, { 0: 10 })])],
      [line(3, [part(5, { 0: 10 })])],
    ]
    const merit = new Map([1, 2, 3].map((proposal) => [proposal, 7 + proposal / 10]))
    let begun: number[] = []
    const input = { asked, line: 3, bins: [bin(10)], standing: [], merit }
    const plan = await mostMeritInBins(
      input,
      (programme, asked_) => {
        begun = [...(programme.start ?? [])].filter((_, at) => programme.isInteger[at] === 1)
        return solveInWorker(programme, asked_)
      },
      limits,
    )
    expect(begun).toEqual([1, 0, 0])
    expect('why' in plan ? plan.why : hours(plan)).toEqual({ 2: 5, 3: 5 })
  })

  it('passes on why the solver has no answer', async () => {
    const none = async () => ({ status: 'failed' as const, values: null, why: 'Gone.' })
    const input = {
      asked: [[line(1, [part(1, { 0: 1 })])]],
      line: 1,
      bins: [bin(1)],
      standing: [],
      merit: new Map(),
    }
    expect(await mostMeritInBins(input, none, limits)).toEqual({ why: 'Gone.' })
  })
})

/** A season from a seed in which much more is asked than offered. */
function made(seed: number) {
  const random = seededUniform(seed)
  const bins = Array.from({ length: 6 }, () => bin(1 + Math.round(random() * 40) / 10))
  const asked = Array.from({ length: 6 }, (_, proposal) => [
    line(proposal, [
      part(
        1 + Math.round(random() * 50) / 10,
        Object.fromEntries(
          bins.flatMap(({ seconds }, at) => (random() < 0.5 ? [[at, (random() * seconds) / h]] : [])),
        ),
      ),
    ]),
  ]).map((lines) =>
    lines.map((one) => ({
      ...one,
      parts: one.parts.map(({ seconds, usable }) => ({
        seconds,
        usable: new Map([...usable].map(([at, can]) => [at, Math.ceil(can)])),
      })),
    })),
  )
  const merit = new Map(asked.map((_, proposal) => [proposal, 5 + Math.round(random() * 50) / 10]))
  return { bins, asked, merit }
}

describe('every choice tried: the plan is the best of all sets of proposals', () => {
  it.each([1, 2, 3])('season %s', { timeout: 30_000 }, async (seed) => {
    const { bins, asked, merit } = made(seed)
    const plan = await solved({ bins, asked, merit, line: asked.length })
    let best = 0
    // Without a least, a set's own best is a linear programme; sets whose members fall below their least are left out.
    for (let set = 0; set < 2 ** asked.length; set += 1) {
      const own = asked.filter((_, at) => (set >> at) % 2 === 1)
      const free = own.map((lines) => lines.map((one) => ({ ...one, least: 0 })))
      const relaxed = await solved({ bins, asked: free, merit, line: free.length })
      const isWorth = own.every((lines) =>
        lines.every(
          ({ proposal, least }) =>
            (relaxed.given.find((one) => one.proposal === proposal)?.seconds ?? 0) >= least - 360,
        ),
      )
      if (isWorth) best = Math.max(best, relaxed.meritHours)
    }
    // Awards are full tenths of an hour.
    expect(plan.meritHours).toBeGreaterThan(best - 10 * 0.1 * asked.length)
    expect(plan.boundMeritHours).toBeGreaterThanOrEqual(best - 1e-6)
    for (const { proposal, seconds } of plan.given) {
      const own = asked[proposal]?.[0]
      expect(seconds).toBeGreaterThanOrEqual((own?.least ?? Infinity) - 360)
      expect(seconds).toBeLessThanOrEqual(own?.seconds ?? 0)
    }
  })
})
