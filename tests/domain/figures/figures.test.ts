import { describe, expect, it } from 'vitest'
import { arrivalCurve } from '@/lib/domain/figures/arrivalCurve'
import { feeSums } from '@/lib/domain/figures/feeSums'
import { pressuresOf } from '@/lib/domain/figures/pressures'
import { spreadOverBins } from '@/lib/domain/figures/spread'
import { withoutSmallCells } from '@/lib/domain/figures/withoutSmallCells'
import type { BinnedLine, NightBin } from '@/lib/panel/nights/binTypes'

// Seen to fail: the second cell told where one is held back, time of a part counted in each of its bins, and the curve
// drawn on past now.

describe('the curve of arrivals', () => {
  const closesAt = new Date('2026-12-15T22:00:00Z')
  const before = (days: number) => new Date(closesAt.getTime() - days * 86_400_000)

  it('climbs a step a proposal, from what had come before it begins to the deadline', () => {
    const arrivals = [before(30), before(2), before(0.25)]
    expect(arrivalCurve(arrivals, closesAt, before(-5), 21)).toEqual([
      [-21, 1],
      [-2, 1],
      [-2, 2],
      [-0.25, 2],
      [-0.25, 3],
      [0, 3],
    ])
  })

  it('ends at now while the call is open, and counts what came late at the deadline', () => {
    expect(arrivalCurve([before(10)], closesAt, before(4), 21).at(-1)).toEqual([-4, 1])
    expect(arrivalCurve([before(-1)], closesAt, before(-2), 21)).toEqual([
      [-21, 0],
      [0, 0],
      [0, 1],
      [0, 1],
    ])
    expect(arrivalCurve([], closesAt, before(30), 21)).toEqual([])
  })
})

const bins: NightBin[] = [
  { telescope: 1, half: 0, siderealFromH: 18, moon: 'dark', seconds: 3600 },
  { telescope: 1, half: 0, siderealFromH: 20, moon: 'bright', seconds: 7200 },
  { telescope: 1, half: 2, siderealFromH: 20, moon: 'dark', seconds: 1800 },
]
const line = (parts: BinnedLine['parts']): BinnedLine => ({
  proposal: 1,
  instrument: 1,
  telescope: 1,
  seconds: parts.reduce((sum, { seconds }) => sum + seconds, 0),
  least: 0,
  possible: true,
  parts,
})

describe('pressure', () => {
  const lines = [
    line([
      {
        seconds: 4000,
        usable: new Map([
          [0, 1000],
          [1, 3000],
        ]),
      },
      { seconds: 500, usable: new Map() },
    ]),
    line([{ seconds: 600, usable: new Map([[2, 10]]) }]),
  ]

  it('lays each part over what serves it, in proportion; nothing is lost', () => {
    const { asked, unserved } = spreadOverBins(lines, bins)
    expect(asked).toEqual([1000, 3000, 600])
    expect(unserved).toBe(500)
  })

  it('sums to the same by half-month, sidereal time and moonlight', () => {
    const { asked } = spreadOverBins(lines, bins)
    const by = pressuresOf(bins, asked, { from: '2027-08-01', to: '2027-09-12' })
    expect(by.byHalfMonth).toEqual([
      { name: '1 to 15 August', askedSeconds: 4000, offeredSeconds: 10_800 },
      { name: '16 to 31 August', askedSeconds: 0, offeredSeconds: 0 },
      { name: '1 to 12 September', askedSeconds: 600, offeredSeconds: 1800 },
    ])
    expect(by.bySidereal.filter(({ offeredSeconds }) => offeredSeconds)).toEqual([
      { name: '18 h to 20 h', askedSeconds: 1000, offeredSeconds: 3600 },
      { name: '20 h to 22 h', askedSeconds: 3600, offeredSeconds: 9000 },
    ])
    expect(by.byMoon.map(({ name, askedSeconds }) => [name, askedSeconds])).toEqual([
      ['Dark', 1600],
      ['Grey', 0],
      ['Bright', 3000],
    ])
    const sum = (rows: { askedSeconds: number }[]) => rows.reduce((all, row) => all + row.askedSeconds, 0)
    expect([sum(by.byHalfMonth), sum(by.bySidereal), sum(by.byMoon)]).toEqual([4600, 4600, 4600])
  })
})

describe('counts of people', () => {
  const told = (...counts: number[]) =>
    withoutSmallCells(counts.map((count, index) => ({ name: String(index), count }))).map(
      ({ count }) => count,
    )
  it.each([
    [
      [12, 7, 9],
      [12, 7, 9],
    ],
    [
      [12, 7, 3],
      [12, null, null],
    ],
    [
      [12, 7, 3, 1],
      [12, 7, null, null],
    ],
    [
      [12, 7, 0],
      [12, 7, 0],
    ],
    [[3], [null]],
    [
      [5, 4, 0],
      [null, null, 0],
    ],
  ])('%j are told as %j', (counts, shown) => {
    expect(told(...counts)).toEqual(shown)
  })
})

it('fees are summed by where they stand, less what was given back', () => {
  const row = (feeState: string | null, feeMinor: number | null, paidMinor = 0, refundedMinor = 0) => ({
    feeState,
    feeMinor,
    paidMinor,
    refundedMinor,
  })
  expect(
    feeSums(
      [
        row('paid', 12_000, 12_000),
        row('refunded', 12_000, 12_000, 12_000),
        row('waived', 6000),
        row('due', 12_000),
        row('invoiced', 24_000),
        row(null, null),
      ],
      'EUR',
    ),
  ).toEqual({ currency: 'EUR', billedMinor: 66_000, paidMinor: 12_000, waivedMinor: 6000, owedMinor: 36_000 })
})
