import { describe, expect, it } from 'vitest'
import { windowsOf } from '@/lib/domain/observability/windowsOf'
import { dateOfMjd, mjdOf } from '@/lib/science/sky'
import { site } from '../../support/contents'
import reference from '../../reference/sky.json'

const position = { raDeg: 52, decDeg: -27.8 }
const minute = 1 / 1440
const hours = (windows: ReturnType<typeof windowsOf>) =>
  24 * windows.reduce((sum, { startMjd, stopMjd }) => sum + stopMjd - startMjd, 0)

describe('modified Julian dates', () => {
  it('are those of Astropy', () => {
    // Time('2027-01-24T00:00:00').mjd and Time('1858-11-17').mjd, astropy 5.2.1.
    expect(mjdOf(new Date('2027-01-24T00:00:00Z'))).toBe(61429)
    expect(mjdOf(new Date('1858-11-17T00:00:00Z'))).toBe(0)
    expect(dateOfMjd(61429.5).toISOString()).toBe('2027-01-24T12:00:00.000Z')
  })
})

describe('windows of a position', () => {
  it('begin and end where Astropy has the target pass the lowest altitude at night', () => {
    const { lowestAltitudeDeg, windows } = reference
    const found = windows.find(
      ({ site: at, date, id }) => at === 'south' && date === '2020-03-20' && id === '3C 273',
    )
    const [rise, set] = (found?.edges ?? []).map(({ at }) => mjdOf(new Date(at)))
    const target = reference.targets.find(({ id }) => id === '3C 273') ?? position
    const [window, ...others] = windowsOf(
      { site: { ...site, lowestAltitudeDeg } },
      target,
      (rise ?? 0) - 0.5,
      (rise ?? 0) + 0.5,
    )
    expect(others).toEqual([])
    expect(Math.abs((window?.startMjd ?? 0) - (rise ?? 0))).toBeLessThan(minute)
    expect(Math.abs((window?.stopMjd ?? 0) - (set ?? 0))).toBeLessThan(minute)
  })

  it('keep clear of what stands around the telescope and of its blind spot', () => {
    const telescope = { horizon: [{ azimuthDeg: 200, altitudeDeg: 40 }], highestAltitudeDeg: 75 }
    const [whole] = windowsOf({ site }, position, 61430, 61431)
    const parts = windowsOf({ site, telescope }, position, 61430, 61431)
    expect(whole && hours([whole])).toBeGreaterThan(hours(parts) + 0.5)
    const east = { ...site, horizon: [{ azimuthDeg: 90, altitudeDeg: 60 }] }
    expect(hours(windowsOf({ site: east }, position, 61430, 61431))).toBeLessThan(hours(parts))
  })

  it('are cut at the ends of the range, whatever dates its nights carry', () => {
    const whole = windowsOf({ site }, position, 61430, 61433)
    expect(whole).toHaveLength(3)
    const [first] = whole
    const middle = ((first?.startMjd ?? 0) + (first?.stopMjd ?? 0)) / 2
    expect(windowsOf({ site }, position, middle, middle + 0.01)).toEqual([
      { startMjd: middle, stopMjd: middle + 0.01 },
    ])
    expect(windowsOf({ site }, position, middle, 61433)[0]).toEqual({
      startMjd: middle,
      stopMjd: first?.stopMjd,
    })
    for (const longitudeDeg of [-179, 0, 179]) {
      const there = { ...site, longitudeDeg }
      const parts = [61430, 61430.5, 61431].map((from) =>
        windowsOf({ site: there }, position, from, from + 0.5),
      )
      expect(hours(parts.flat())).toBeCloseTo(hours(windowsOf({ site: there }, position, 61430, 61431.5)), 6)
    }
  })

  it('run on past noon through a polar night', () => {
    const pole = { ...site, latitudeDeg: 89, lowestAltitudeDeg: 20 }
    const from = mjdOf(new Date('2026-12-10T06:00:00Z'))
    expect(windowsOf({ site: pole }, { raDeg: 10, decDeg: 80 }, from, from + 5)).toEqual([
      { startMjd: from, stopMjd: from + 5 },
    ])
    expect(windowsOf({ site: pole }, { raDeg: 10, decDeg: -80 }, from, from + 5)).toEqual([])
  })
})
