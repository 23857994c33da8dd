import { expect, it } from 'vitest'
import { leastUseful } from '@/lib/panel/nights/leastUseful'
import { lineByHours } from '@/lib/panel/nights/lineByHours'
import type { AskedLine } from '@/lib/panel/nights/types'

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
