import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { keptBins, keptLine, keptShares } from '@/lib/panel/nights/allowFor'
import type { BinnedLine, BinnedPart, NightBin } from '@/lib/panel/nights/binTypes'
import { byRankInBins } from '@/lib/panel/nights/byRankInBins'
import { fillerLine } from '@/lib/panel/nights/fillerLine'
import { placeMusts } from '@/lib/panel/nights/placeMusts'
import { seededUniform } from '@/lib/panel/random'
import { solveInWorker } from '@/lib/services/solver/solveInWorker'

// Seen to fail with the least left out of the programme, with the set not made smaller, with the shares of weather and of
// what is held back added, and with fillers let into grey time.

const h = 3600
const limits = { seconds: 10, relativeGap: 1e-6 }
const bin = (hours: number, more: Partial<NightBin> = {}): NightBin => ({
  ...{ telescope: 1, half: 0, siderealFromH: 0, moon: 'dark' as const, seconds: hours * h },
  ...more,
})
const part = (hours: number, usable: Record<number, number>): BinnedPart => ({
  seconds: hours * h,
  usable: new Map(Object.entries(usable).map(([at, can]) => [Number(at), can * h])),
})
const line = (proposal: number, parts: BinnedPart[], leastHours?: number): BinnedLine => {
  const seconds = parts.reduce((sum, one) => sum + one.seconds, 0)
  const least = leastHours === undefined ? seconds / 2 : leastHours * h
  return { proposal, instrument: 10, telescope: 1, seconds, least, possible: true, parts }
}
const place = (musts: BinnedLine[][], bins: NightBin[], standing: BinnedLine[] = []) =>
  placeMusts(musts, { bins, standing, solve: solveInWorker, limits })

describe('what must be given time', () => {
  it('takes its whole where that leaves the others enough', async () => {
    const musts = [[line(1, [part(4, { 0: 9 })])], [line(2, [part(5, { 0: 9 })])]]
    expect(await place(musts, [bin(9)])).toEqual({ placed: musts })
  })

  it('gives way to its least where the others would find too little', async () => {
    const musts = [[line(1, [part(6, { 0: 9 })])], [line(2, [part(6, { 0: 9 })], 5)]]
    const found = await place(musts, [bin(9)])
    const given = 'placed' in found ? byRankInBins(found.placed, [bin(9)]).given : []
    expect(given.map(({ proposal, seconds }) => [proposal, seconds / h])).toEqual([
      [1, 4],
      [2, 5],
    ])
  })

  it('that cannot all be: the smallest set is named, without the bystander', async () => {
    const musts = [
      [line(1, [part(6, { 0: 9 })], 6)],
      [line(2, [part(2, { 1: 9 })], 2)],
      [line(3, [part(6, { 0: 9 })], 6)],
    ]
    expect(await place(musts, [bin(9), bin(9)])).toEqual({ conflict: [1, 3] })
  })

  it('alone finds too little, is not possible, or stands behind what is given elsewhere', async () => {
    expect(await place([[line(1, [part(6, { 0: 2 })])]], [bin(9)])).toEqual({ conflict: [1] })
    const off = { ...line(1, [part(2, { 0: 9 })]), possible: false }
    expect(await place([[off]], [bin(9)])).toEqual({ conflict: [1] })
    expect(await place([[line(1, [part(6, { 0: 9 })])]], [bin(9)], [line(9, [part(7, { 0: 9 })])])).toEqual({
      conflict: [1],
    })
  })

  it('is not called impossible when the solver only had no time', async () => {
    const musts = [[line(1, [part(6, { 0: 9 })], 5)], [line(2, [part(6, { 0: 9 })], 5)]]
    const none = async () => ({ status: 'unfinished' as const, values: null, why: 'No time.' })
    expect(await placeMusts(musts, { bins: [bin(9)], standing: [], solve: none, limits })).toEqual({
      why: 'No time.',
    })
  })
})

/** Whether every line can have its least: every division of whole hours tried, one after the other. */
function fits(lines: readonly BinnedLine[], free: readonly number[], at = 0, partAt = 0, had = 0): boolean {
  const one = lines[at]
  if (!one) return true
  const own = one.parts[partAt]
  if (!own) return had >= one.least / h && fits(lines, free, at + 1)
  const tries = (
    bins: readonly (readonly [number, number])[],
    left: number,
    now: readonly number[],
  ): boolean => {
    const [first, ...rest] = bins
    if (!first) return fits(lines, now, at, partAt + 1, had + own.seconds / h - left)
    const most = Math.min(left, first[1] / h, now[first[0]] ?? 0)
    for (let hours = most; hours >= 0; hours -= 1)
      if (
        tries(
          rest,
          left - hours,
          now.map((value, index) => (index === first[0] ? value - hours : value)),
        )
      )
        return true
    return false
  }
  return tries([...own.usable], own.seconds / h, free)
}

describe('every division of whole hours tried: musts fit, or the set named is a smallest that does not', () => {
  it.each(Array.from({ length: 25 }, (_, seed) => seed))('season %i', { timeout: 30_000 }, async (seed) => {
    const random = seededUniform(seed)
    const whole = (most: number) => 1 + Math.floor(random() * most)
    const bins = [bin(whole(4)), bin(whole(4)), bin(whole(4))]
    const some = () =>
      part(whole(4), Object.fromEntries([0, 1, 2].flatMap((at) => (random() < 0.5 ? [[at, whole(4)]] : []))))
    const musts = Array.from({ length: 3 }, (_, proposal) => {
      const parts = random() < 0.5 ? [some()] : [some(), some()]
      const asked = parts.reduce((sum, one) => sum + one.seconds, 0) / h
      return [line(proposal, parts, whole(asked))]
    })
    const free = bins.map(({ seconds }) => seconds / h)
    const found = await place(musts, bins)
    if ('placed' in found) {
      expect(fits(musts.flat(), free)).toBe(true)
      const plan = byRankInBins(found.placed, bins)
      for (const [own] of musts)
        expect(
          plan.given.find(({ proposal }) => proposal === own?.proposal)?.seconds ?? 0,
        ).toBeGreaterThanOrEqual((own?.least ?? 0) - 1)
      return
    }
    const conflict = 'conflict' in found ? found.conflict : []
    const named = musts.flat().filter(({ proposal }) => conflict.includes(proposal))
    expect(fits(named, free)).toBe(false)
    for (const one of named)
      expect(
        fits(
          named.filter((other) => other !== one),
          free,
        ),
      ).toBe(true)
  })
})

describe('the allowance', () => {
  it('is what the weather leaves of what is not held back, of bins and of targets alike', () => {
    const bins = [bin(10), bin(10, { half: 1 }), bin(10, { telescope: 2 })]
    const kept = keptShares(bins, { lostByHalf: [0.2, 0.5], heldShare: new Map([[1, 0.1]]) })
    expect(kept.map((share) => Number(share.toFixed(12)))).toEqual([0.72, 0.45, 0.8])
    expect(keptBins(bins, kept).map(({ seconds }) => seconds / h)).toEqual([7.2, 4.5, 8])
    const own = keptLine(line(1, [part(5, { 0: 5, 1: 4 })]), kept)
    expect([...(own.parts[0]?.usable ?? [])].map(([at, can]) => [at, can / h])).toEqual([
      [0, 3.6],
      [1, 1.8],
    ])
  })

  it('leaves nothing where every night is lost or everything is held back, and never less', () => {
    const bins = [bin(10), bin(10, { telescope: 2 })]
    expect(keptShares(bins, { lostByHalf: [1.4], heldShare: new Map() })).toEqual([0, 0])
    expect(keptShares(bins, { lostByHalf: [], heldShare: new Map([[2, 7]]) })).toEqual([1, 0])
    expect(keptLine(line(1, [part(5, { 0: 5 })]), [0, 0]).parts[0]?.usable.size).toBe(0)
  })
})

describe('a division under every term', () => {
  const hours = fc.integer({ min: 1, max: 12 })
  const aBin = fc
    .record({ hours, half: fc.integer({ min: 0, max: 2 }), moon: fc.constantFrom('dark', 'grey', 'bright') })
    .map(({ hours: of, ...more }) => bin(of, more as Partial<NightBin>))
  const aPart = fc
    .record({ hours, usable: fc.dictionary(fc.constantFrom('0', '1', '2', '3'), hours) })
    .map((one) => part(one.hours, one.usable))

  it('lays no second where a target is not usable or a bin has none left, and fillers in bright bins only', () => {
    fc.assert(
      fc.property(
        fc.array(aBin, { minLength: 4, maxLength: 4 }),
        fc.array(fc.array(aPart, { minLength: 1, maxLength: 2 }), { maxLength: 6 }),
        fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { minLength: 3, maxLength: 3 }),
        fc.double({ min: 0, max: 1, noNaN: true }),
        (bins, parts, lostByHalf, held) => {
          const kept = keptShares(bins, { lostByHalf, heldShare: new Map([[1, held]]) })
          const net = keptBins(bins, kept)
          const lines = parts.map((own, proposal) => keptLine(line(proposal, own), kept))
          const asked = lines.map((own, at) => [at % 3 === 2 ? fillerLine(own, net) : own])
          const plan = byRankInBins(asked, net)
          for (const [at, { seconds }] of net.entries()) {
            const used = plan.given.reduce((sum, { laid }) => sum + (laid.get(at) ?? 0), 0)
            expect(used).toBeLessThanOrEqual(seconds)
            expect(seconds).toBeLessThanOrEqual((bins[at]?.seconds ?? 0) * (1 - held) + 1e-6)
          }
          for (const { proposal, seconds, laid } of plan.given) {
            const own = lines[proposal] as BinnedLine
            expect(seconds).toBeGreaterThanOrEqual(own.least)
            expect([...laid.values()].reduce((sum, one) => sum + one, 0)).toBe(seconds)
            for (const [at, used] of laid) {
              const usable = own.parts.reduce((sum, one) => sum + (one.usable.get(at) ?? 0), 0)
              expect(used).toBeLessThanOrEqual(usable)
              if (proposal % 3 === 2) expect(net[at]?.moon).toBe('bright')
            }
          }
        },
      ),
    )
  })
})
