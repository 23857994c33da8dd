import { describe, expect, it } from 'vitest'
import {
  formatAtSite,
  formatCalendarDate,
  formatCountdown,
  formatDay,
  formatDayWithYear,
  formatDuration,
  formatHours,
  formatHoursFromSeconds,
  formatNights,
  formatOffset,
  formatUtc,
  formatUtcClock,
  formatUtcInstant,
  formatUtcMinute,
  formatUtcWithYear,
} from '@/lib/format'

// Seen to fail with Math.floor replaced by Math.round in formatCountdown.

const deadline = new Date('2027-03-31T22:00:00Z')
const received = new Date('2027-03-21T01:04:29Z')
const plain = (text: string) => text.replaceAll('\u00a0', ' ')

describe('instants in UTC', () => {
  it.each([
    [formatUtc(deadline), '31 March 22:00 UTC'],
    [formatUtcWithYear(deadline), '31 March 2027, 22:00 UTC'],
    [formatUtcInstant(received), '01:04:29 UTC on 21 March 2027'],
    [formatUtcClock(received), '01:04:29 UTC'],
    [formatUtcMinute(received), '01:04'],
    [formatDay(received), '21 March'],
    [formatDayWithYear(received), '21 March 2027'],
    [formatCalendarDate('2027-10-05', false), '5 October'],
    [formatCalendarDate('2027-10-05'), '5 October 2027'],
  ])('%s', (written, expected) => {
    expect(written).toBe(expected)
  })
})

describe('the site', () => {
  it('reads the same instant on its own clock, across midnight too', () => {
    expect(formatAtSite(deadline, -3)).toBe('19:00 at the site')
    expect(formatAtSite(received, -3)).toBe('22:04 at the site')
    expect(formatAtSite(received, 5.5)).toBe('06:34 at the site')
  })
  it.each([
    [-3, 'UTC−3'],
    [5.5, 'UTC+5:30'],
    [0, 'UTC'],
  ])('names the zone %s h from UTC %s', (offset, name) => {
    expect(formatOffset(offset)).toBe(name)
  })
})

describe('formatCountdown', () => {
  const minute = 60_000
  it.each([
    [((13 * 24 + 19) * 60 + 45) * minute, 3, '13 d 19 h 45 min'],
    [((13 * 24 + 19) * 60 + 45) * minute, 2, '13 d 19 h'],
    [(12 * 60 + 19) * minute + 59_000, 3, '12 h 19 min'],
    [24 * 60 * minute, 3, '1 d 0 h 0 min'],
    [8 * minute, 3, '8 min'],
    [59_999, 3, '59 s'],
    [0, 3, '0 s'],
    [-5, 3, '0 s'],
  ])('writes %i ms in at most %i parts as %s', (left, parts, text) => {
    expect(plain(formatCountdown(left, parts))).toBe(text)
  })
  it('never promises a minute too many', () => {
    expect(plain(formatCountdown(2 * minute - 1))).toBe('1 min')
  })
})

describe('lengths of time', () => {
  it.each([
    [586, '586 s'],
    [2100, '35 min'],
    [7500, '2 h 05 min'],
    [3599, '1 h 00 min'],
  ])('writes %i seconds as %s', (seconds, text) => {
    expect(plain(formatDuration(seconds))).toBe(text)
  })
  it('gives hours one decimal and nights two', () => {
    expect(plain(formatHours(21))).toBe('21.0 h')
    expect(plain(formatHoursFromSeconds(75_600))).toBe('21.0 h')
    expect(formatHoursFromSeconds(null)).toBe('–')
    expect(plain(formatNights(2.5))).toBe('2.50 nights')
    expect(plain(formatNights(1))).toBe('1.00 night')
  })
})
