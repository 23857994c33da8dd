import { describe, expect, it } from 'vitest'
import { byRankThenFill } from '@/lib/panel/nights/byRankThenFill'
import { leastUseful } from '@/lib/panel/nights/leastUseful'
import { lineByHours } from '@/lib/panel/nights/lineByHours'
import type { AskedLine } from '@/lib/panel/nights/types'
import { seededUniform } from '@/lib/panel/random'

const h = 3600
const line = (
  proposal: number,
  telescope: number,
  hours: number,
  more: Partial<AskedLine> = {},
): AskedLine => ({
  proposal,
  instrument: telescope * 10,
  telescope,
  seconds: hours * h,
  least: (hours * h) / 2,
  possible: true,
  ...more,
})

describe('by rank, then fill', () => {
  it('gives whole while it fits, then part if useful, then lets the next one fill', () => {
    const asked = [[line(1, 1, 50)], [line(2, 1, 40)], [line(3, 1, 30)], [line(4, 1, 4)]]
    const plan = byRankThenFill({ asked, line: 3, offered: new Map([[1, 80 * h]]) })
    expect(plan.given.map(({ proposal, seconds }) => [proposal, seconds / h])).toEqual([
      [1, 50],
      [2, 30],
    ])
    expect(plan.notGiven.map(({ proposal, reason, left }) => [proposal, reason, left])).toEqual([
      [3, 'too-little-left', 0],
      [4, 'too-little-left', 0],
    ])
  })

  it('passes over a proposal whose least useful award does not fit', () => {
    const asked = [[line(1, 1, 50)], [line(2, 1, 90)], [line(3, 1, 20)]]
    const plan = byRankThenFill({ asked, line: 2, offered: new Map([[1, 80 * h]]) })
    expect(plan.given.map(({ proposal }) => proposal)).toEqual([1, 3])
    expect(plan.notGiven).toEqual([{ proposal: 2, instrument: 10, reason: 'too-little-left', left: 30 * h }])
  })

  it('gives nothing to what was assessed as not possible', () => {
    const plan = byRankThenFill({
      asked: [[line(1, 1, 5, { possible: false })]],
      line: 1,
      offered: new Map([[1, 80 * h]]),
    })
    expect(plan).toEqual({
      given: [],
      notGiven: [{ proposal: 1, instrument: 10, reason: 'not-possible', left: 80 * h }],
    })
  })

  it('gives a proposal on two telescopes both or none', () => {
    const asked = [[line(1, 1, 10), line(1, 2, 60)], [line(2, 1, 70)]]
    const plan = byRankThenFill({
      asked,
      line: 2,
      offered: new Map([
        [1, 70 * h],
        [2, 20 * h],
      ]),
    })
    expect(plan.given.map(({ proposal, seconds }) => [proposal, seconds / h])).toEqual([[2, 70]])
  })

  it.each(Array.from({ length: 40 }, (_, i) => i))(
    'never gives more than is offered or asked (%i)',
    (seed) => {
      const random = seededUniform(seed)
      const asked = Array.from({ length: 30 }, (_, proposal) =>
        [1, 2].filter(() => random() < 0.7).map((telescope) => line(proposal, telescope, 1 + random() * 60)),
      ).filter((lines) => lines.length > 0)
      const offered = new Map([
        [1, random() * 400 * h],
        [2, random() * 300 * h],
      ])
      const { given } = byRankThenFill({ asked, line: 12, offered })
      for (const [telescope, seconds] of offered)
        expect(
          given.filter((one) => one.telescope === telescope).reduce((sum, one) => sum + one.seconds, 0),
        ).toBeLessThanOrEqual(seconds)
      for (const one of given) {
        const wanted = asked
          .flat()
          .find((a) => a.proposal === one.proposal && a.instrument === one.instrument)
        expect(one.seconds).toBeGreaterThanOrEqual(wanted?.least ?? Infinity)
        expect(one.seconds).toBeLessThanOrEqual(wanted?.seconds ?? 0)
      }
    },
  )
})

it.each([
  [0, 0],
  [60, 60],
  [7200, 3600],
  [7230, 3660],
])('the least useful part of %i s is %i s', (asked, least) => expect(leastUseful(asked)).toBe(least))

it('the line falls after the last proposal that fits on every telescope', () => {
  const asked = [[line(1, 1, 30)], [line(2, 2, 30)], [line(3, 1, 30)], [line(4, 2, 1)]]
  expect(
    lineByHours(
      asked,
      new Map([
        [1, 50 * h],
        [2, 40 * h],
      ]),
    ),
  ).toBe(2)
  expect(
    lineByHours(
      asked,
      new Map([
        [1, 60 * h],
        [2, 40 * h],
      ]),
    ),
  ).toBe(4)
  expect(lineByHours([], new Map())).toBe(0)
})
