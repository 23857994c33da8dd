import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { lostNights } from '@/lib/panel/nights/lostNights'
import { SeasonRunner } from '@/lib/panel/nights/seasonRunner'
import type { SeasonPart, SeasonPlan } from '@/lib/panel/nights/seasonTypes'
import { simulateSeasons } from '@/lib/panel/nights/simulateSeasons'
import { seededUniform } from '@/lib/panel/random'
import { wilsonInterval } from '@/lib/panel/statistics/wilsonInterval'
import made from '../../reference/seasons.json'

// Seen to fail with the persistence drawn the other way round, with the second round served before the first, with a share
// taken twice of one piece, and with the interval of the plain share.

const h = 3600
const numbers = (table: Record<string, number | undefined>) =>
  new Map(Object.entries(table).map(([bin, own]) => [Number(bin), own ?? 0]))
const part = (
  seconds: number,
  laid: Record<string, number | undefined>,
  share: Record<string, number | undefined>,
): SeasonPart => ({
  seconds,
  laid: numbers(laid),
  share: numbers(share),
})

/** A season of whole nights of one bin each, and one award that needs some of them. */
const nightsNeeded = (nights: number, needed: number, lost: number, persistence: number): SeasonPlan => ({
  lost: Array.from({ length: nights }, () => lost),
  persistence,
  pieces: Array.from({ length: nights }, (_, night) => ({ night, bin: 0, seconds: 8 * h })),
  awards: [{ proposal: 1, instrument: 1, parts: [part(needed * 8 * h, { 0: needed * 8 * h }, { 0: 1 })] }],
})

/** P(at least `needed` clear nights of `nights`) of the chain, by adding over every count of clear nights. */
function exactChance(nights: number, needed: number, p: number, r: number): number {
  // [clear nights so far][1: the last was lost]
  let odds = Array.from({ length: nights + 1 }, () => [0, 0])
  const at = (table: number[][], k: number, last: number) => table[k]?.[last] ?? 0
  ;(odds[0] as number[])[1] = p
  ;(odds[1] as number[])[0] = 1 - p
  for (let night = 1; night < nights; night += 1)
    odds = odds.map((_, k) => {
      const lost = at(odds, k, 1) * (p + r * (1 - p)) + at(odds, k, 0) * p * (1 - r)
      const clear = at(odds, k - 1, 1) * (1 - p) * (1 - r) + at(odds, k - 1, 0) * (1 - p * (1 - r))
      return [clear, lost]
    })
  return odds.slice(needed).reduce((sum, [clear = 0, lost = 0]) => sum + clear + lost, 0)
}

describe('nights lost', () => {
  it('are lost as often as they should be, and as their neighbours are', () => {
    const uniform = seededUniform(3)
    const seasons = Array.from({ length: 20_000 }, () => lostNights([0.2, 0.2, 0.2, 0.6, 0.6], 0.5, uniform))
    const mean = (of: (lost: Uint8Array) => number) =>
      seasons.reduce((sum, lost) => sum + of(lost), 0) / seasons.length
    for (const [night, chance] of [0.2, 0.2, 0.2, 0.6, 0.6].entries())
      expect(Math.abs(mean((lost) => lost[night] ?? 0) - chance)).toBeLessThan(0.015)
    const together = mean((lost) => (lost[0] ?? 0) * (lost[1] ?? 0))
    expect((together - 0.04) / (0.2 * 0.8)).toBeGreaterThan(0.46)
    expect((together - 0.04) / (0.2 * 0.8)).toBeLessThan(0.54)
  })

  it('are none in a sky that is always clear, and all in one that never is', () => {
    expect([...lostNights([0, 0, 0], 0.4, seededUniform(1))]).toEqual([0, 0, 0])
    expect([...lostNights([1, 1, 1], 0.4, seededUniform(1))]).toEqual([1, 1, 1])
    expect(lostNights([], 0.4, seededUniform(1))).toHaveLength(0)
  })
})

describe('chances in closed form', () => {
  it.each([
    [10, 1, 0.7, 0],
    [10, 6, 0.3, 0],
    [30, 20, 0.3, 0],
    [30, 20, 0.3, 0.6],
    [12, 12, 0.05, 0.3],
  ])('%i nights, %i needed, %f lost, correlated by %f', (nights, needed, p, r) => {
    const [found] = simulateSeasons(nightsNeeded(nights, needed, p, r), { seed: 11, seasons: 20_000 })
    const exact = exactChance(nights, needed, p, r)
    const error = Math.sqrt((exact * (1 - exact)) / 20_000)
    expect(Math.abs((found?.chance ?? NaN) - exact)).toBeLessThan(4 * error)
  })

  it('of the chain without correlation are the binomial ones', () => {
    const choose = (n: number, k: number): number => (k === 0 ? 1 : (choose(n - 1, k - 1) * n) / k)
    const binomial = [6, 7, 8, 9, 10].reduce((sum, k) => sum + choose(10, k) * 0.7 ** k * 0.3 ** (10 - k), 0)
    expect(exactChance(10, 6, 0.3, 0)).toBeCloseTo(binomial, 12)
  })
})

describe('a plan run by NumPy', () => {
  for (const [index, one] of made.cases.entries()) {
    const plan: SeasonPlan = {
      ...one.plan,
      awards: one.plan.awards.map(({ parts, ...award }) => ({
        ...award,
        parts: parts.map(({ seconds, laid, share }) => part(seconds, laid, share)),
      })),
    }
    it(`is run to the second, case ${index}`, () => {
      const runner = new SeasonRunner(plan)
      for (const { lost, seconds } of one.runs) {
        const found = runner.run(Uint8Array.from(lost, Number))
        for (const [award, expected] of seconds.entries())
          expect(Math.abs((found[award] ?? NaN) - expected)).toBeLessThan(0.002)
      }
    })
    it(`has the same chances within the noise of both, case ${index}`, () => {
      const seasons = 4000
      const found = simulateSeasons(plan, { seed: 5, seasons })
      for (const [award, chance] of one.chances.entries()) {
        const noise = Math.sqrt(chance * (1 - chance) * (1 / seasons + 1 / made.seasons))
        expect(Math.abs((found[award]?.chance ?? NaN) - chance)).toBeLessThan(4.5 * noise + 1 / seasons)
      }
    })
  }
})

describe('seasons', () => {
  it('are the same for the same seed, and others for another', () => {
    const plan = nightsNeeded(30, 20, 0.3, 0.4)
    const once = simulateSeasons(plan, { seed: 1, seasons: 300 })
    expect(simulateSeasons(plan, { seed: 1, seasons: 300 })).toEqual(once)
    expect(simulateSeasons(plan, { seed: 2, seasons: 300 })).not.toEqual(once)
  })

  it('tell how far they are', () => {
    const told: number[] = []
    simulateSeasons(nightsNeeded(3, 1, 0.3, 0), { seed: 1, seasons: 1000 }, (done) => told.push(done))
    expect(told).toHaveLength(100)
    expect(told.at(-1)).toBe(1000)
  })

  it('give no more than was asked, than a target can use, or than the clear nights hold', () => {
    const share = fc.dictionary(fc.constantFrom('0', '1', '2'), fc.double({ min: 0.1, max: 1, noNaN: true }))
    const onePart = fc
      .record({
        seconds: fc.integer({ min: 1, max: 40_000 }),
        share,
        planned: fc.integer({ min: 0, max: 9000 }),
      })
      .map(({ seconds, share: own, planned }) =>
        part(seconds, Object.fromEntries(Object.keys(own).map((bin) => [bin, planned])), own),
      )
    fc.assert(
      fc.property(
        fc.array(fc.array(onePart, { minLength: 1, maxLength: 2 }), { maxLength: 5 }),
        fc.array(fc.tuple(fc.integer({ min: 0, max: 2 }), fc.integer({ min: 1, max: 9000 }), fc.boolean()), {
          maxLength: 25,
        }),
        (awards, nights) => {
          const plan: SeasonPlan = {
            lost: nights.map(() => 0.5),
            persistence: 0.5,
            pieces: nights.map(([bin, seconds], night) => ({ night, bin, seconds })),
            awards: awards.map((parts, proposal) => ({ proposal, instrument: 1, parts })),
          }
          const clear = nights.filter(([, , isLost]) => !isLost)
          const found = new SeasonRunner(plan).run(
            Uint8Array.from(nights, ([, , isLost]) => (isLost ? 1 : 0)),
          )
          const sum = (values: Iterable<number>) => [...values].reduce((total, one) => total + one, 0)
          expect(sum(found)).toBeLessThanOrEqual(sum(clear.map(([, seconds]) => seconds)) + 1e-3)
          for (const [award, parts] of awards.entries()) {
            const most = parts.map((one) =>
              Math.min(one.seconds, sum(clear.map(([bin, seconds]) => seconds * (one.share.get(bin) ?? 0)))),
            )
            expect(found[award]).toBeLessThanOrEqual(sum(most) + 1e-3)
          }
        },
      ),
    )
  })
})

describe('the interval of a chance', () => {
  it('is that of the published example', () => {
    // Newcombe (1998, Stat. Med. 17, 857), table I, method 3: 81 of 263 and 0 of 20.
    expect(wilsonInterval(81, 263).low).toBeCloseTo(0.2553, 4)
    expect(wilsonInterval(81, 263).high).toBeCloseTo(0.3662, 4)
    expect(wilsonInterval(0, 20).low).toBe(0)
    expect(wilsonInterval(0, 20).high).toBeCloseTo(0.1611, 4)
    expect(wilsonInterval(0, 0)).toEqual({ low: 0, high: 1 })
  })
})
