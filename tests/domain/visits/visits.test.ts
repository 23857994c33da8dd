import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { NightBlock } from '@/lib/domain/calls/nightBlock'
import type { SeasonBins } from '@/lib/domain/nights/seasonBins'
import { blocksLessHalves } from '@/lib/domain/visits/blocksLessHalves'
import { halvesOf, nightHalves, overlapMs } from '@/lib/domain/visits/nightHalves'
import type { NightHalf } from '@/lib/domain/visits/types'
import { visitInTheWay } from '@/lib/domain/visits/visitInTheWay'
import { withoutVisits } from '@/lib/domain/visits/withoutVisits'

// Seen to fail with a visit taken off the bins of another telescope, with a piece cut at one end only, with nights bound to
// another instrument open, and with a half counted free that is blocked for a minute.

const hour = 3_600_000
const evenings = ['2027-07-01', '2027-07-02', '2027-07-03'] as const
const span = (date: string): [number, number] => {
  const from = Date.parse(`${date}T23:00Z`)
  return [from, from + 10 * hour]
}
const dark = new Map(evenings.map((date) => [date, span(date)]))

/** Stretches of whole minutes of each evening on two telescopes, in three bins; those of a telescope never overlap. */
const season = fc
  .array(
    fc.record({
      telescope: fc.constantFrom(1, 2),
      date: fc.constantFrom(...evenings),
      cuts: fc.uniqueArray(fc.integer({ min: 0, max: 600 }), { minLength: 2, maxLength: 6 }),
    }),
    { maxLength: 6 },
  )
  .map((rows): SeasonBins => {
    const bins = [1, 2].flatMap((telescope) =>
      [null, 10, 20].map((instrument) => ({
        ...{ telescope, instrument, half: 0, siderealFromH: 0, moon: 'dark' as const, seconds: 0 },
      })),
    )
    const seen = new Set<string>()
    const pieces = rows.flatMap(({ telescope, date, cuts }) => {
      if (seen.has(`${telescope} ${date}`)) return []
      seen.add(`${telescope} ${date}`)
      const at = [...cuts].sort((a, b) => a - b)
      return at.slice(1).map((to, i) => ({
        bin: (telescope - 1) * 3 + (i % 3),
        date,
        from: span(date)[0] + (at[i] ?? 0) * 60_000,
        to: span(date)[0] + to * 60_000,
      }))
    })
    for (const { bin, from, to } of pieces) {
      const own = bins[bin]
      if (own) own.seconds += (to - from) / 1000
    }
    return { bins, pieces }
  })
const half = fc
  .record({ telescope: fc.constantFrom(1, 2), date: fc.constantFrom(...evenings), at: fc.constantFrom(0, 1) })
  .map(({ telescope, date, at }): NightHalf => {
    const [from, to] = halvesOf(span(date))[at] ?? [0, 0]
    return { telescope, date, half: at === 0 ? 'first' : 'second', from, to, seconds: (to - from) / 1000 }
  })

describe('a season less what visits have of it', () => {
  it('has every second of it once: with them or with the queue', () => {
    fc.assert(
      fc.property(
        season,
        fc.uniqueArray(half, { maxLength: 4, selector: (one) => JSON.stringify(one) }),
        (whole, halves) => {
          const left = withoutVisits(whole, halves)
          for (const [at, bin] of whole.bins.entries()) {
            const own = (of: SeasonBins) =>
              of.pieces.filter((piece) => piece.bin === at).map(({ from, to }) => [from, to] as const)
            const taken = halves
              .filter(({ telescope }) => telescope === bin.telescope)
              .reduce((sum, { from, to }) => sum + overlapMs([from, to], own(whole)), 0)
            expect(left.bins[at]?.seconds).toBe(bin.seconds - taken / 1000)
            for (const { from, to, telescope } of halves)
              if (telescope === bin.telescope) expect(overlapMs([from, to], own(left))).toBe(0)
          }
        },
      ),
      { seed: 1, numRuns: 200 },
    )
  })

  it('opens no half to a visit that is not whole for its instrument, and none twice', () => {
    fc.assert(
      fc.property(season, half, fc.constantFrom(10, 20), (whole, given, instrument) => {
        const { telescope } = given
        const found = nightHalves(whole, dark, { telescope, instrument })
        for (const { from, to, date } of found) {
          const open = whole.pieces.filter((piece) => {
            const bin = whole.bins[piece.bin]
            const isOwn = bin?.instrument === null || bin?.instrument === instrument
            return bin?.telescope === telescope && isOwn && piece.date === date
          })
          const covered = overlapMs(
            [from, to],
            open.map((piece) => [piece.from, piece.to] as const),
          )
          expect(covered).toBe(to - from)
        }
        const left = nightHalves(withoutVisits(whole, [given]), dark, { telescope, instrument })
        expect(left.some((one) => one.date === given.date && one.half === given.half)).toBe(false)
        expect(left).toEqual(found.filter((one) => one.date !== given.date || one.half !== given.half))
      }),
      { seed: 2, numRuns: 300 },
    )
  })
})

describe('the calendar of the office', () => {
  const block = (more: Partial<NightBlock> = {}): NightBlock => ({
    ...{ telescopeId: 1, instrumentId: null, eveningDate: '2027-07-01', useFor: 'science', note: '' },
    ...{ from: 0, to: 1, darkSeconds: 36_000 },
    ...more,
  })
  const visit = {
    ...{ proposalId: 5, instrumentId: 10, telescopeId: 1, date: '2027-07-01', seconds: 18_000 },
    half: 'second' as const,
  }

  it('keeps a visit’s half whole, in one part or two, with its instrument', () => {
    expect(visitInTheWay([visit], [block()])).toBeNull()
    expect(visitInTheWay([visit], [block({ to: 0.7 }), block({ from: 0.7, instrumentId: 10 })])).toBeNull()
    expect(visitInTheWay([visit], [block({ from: 0.6 })])).toEqual(visit)
    expect(visitInTheWay([visit], [block({ instrumentId: 20 })])).toEqual(visit)
    expect(visitInTheWay([visit], [block({ useFor: 'engineering' })])).toEqual(visit)
    expect(visitInTheWay([visit], [])).toEqual(visit)
  })

  it('leaves others the rest of the night', () => {
    const left = (from: number, to: number) =>
      blocksLessHalves([block({ from, to })], [visit]).map((one) => [one.from, one.to])
    expect(left(0, 1)).toEqual([[0, 0.5]])
    expect(left(0.6, 0.9)).toEqual([])
    expect(left(0.3, 0.4)).toEqual([[0.3, 0.4]])
    expect(blocksLessHalves([block({ telescopeId: 2 })], [visit])).toHaveLength(1)
  })
})
