import { describe, expect, it } from 'vitest'
import { neverUp, type NeverUpInput } from '../../../lib/science/feasibility'

const asked = (change: Partial<NeverUpInput>) =>
  neverUp({
    site: { latitudeDeg: -37.4, lowestAltitudeDeg: 20 },
    raDeg: 187.7,
    decDeg: 2,
    maxAirmass: 1.8,
    isEverDark: true,
    ...change,
  })

describe('analytic: a target culminates at 90 degrees less the distance of its declination from the latitude', () => {
  it('below the horizon', () => {
    const { why, fix } = asked({ decDeg: 85 })
    expect(why).toBe('Never rises here: at its highest it is 32° below the horizon.')
    expect(fix).toBe('Take another target: no season brings this one up here.')
  })

  it('below what the telescope reaches', () => {
    expect(asked({ decDeg: 38 }).why).toBe('Climbs to 15° at most; the telescope goes no lower than 20°.')
  })

  it('below the airmass asked: what would do is the airmass at the top, rounded up', () => {
    // 1/sin(27.6 deg) = 2.158, a plane-parallel air; the curved one is thinner by 0.01.
    const { why, fix } = asked({ decDeg: 25 })
    expect(why).toBe('Climbs to 28° at most, airmass 2.15: never within 1.8.')
    expect(fix).toBe('Accept an airmass of 2.2 or more.')
  })
})

describe('behind what stands around the telescope', () => {
  const wall = (altitudeDeg: number) => ({ horizons: [[{ azimuthDeg: 0, altitudeDeg }]] })

  // At declination 2 degrees it culminates at 50.6 degrees; airmass 1.8 is reached at 33.6.
  it('a level wall higher than its culmination hides it in every season, a lower one does not', () => {
    expect(asked({ pointing: wall(52) })).toEqual({
      why: 'Climbs to 51° at most, but never above airmass 1.8, clear of the horizon.',
      fix: 'Accept a larger airmass, or ask for another telescope.',
    })
    expect(asked({ pointing: wall(49) }).why).toBe(
      'Never above airmass 1.8, clear of the horizon, in the dark in this season.',
    )
  })
})

describe('in daylight only', () => {
  // M 87 at 12 h 31 m stands opposite the Sun in late March; Fomalhaut, 22 h 58 m, in early September.
  it.each([
    [187.7, 12.4, 'March'],
    [344.4, -29.6, 'September'],
    [0, -29, 'September'],
    [287, -29, 'July'],
  ])('right ascension %s is highest at midnight in its month', (raDeg, decDeg, month) => {
    expect(asked({ raDeg, decDeg }).fix).toContain(` ${month},`)
  })

  it('no night is dark', () => {
    expect(asked({ isEverDark: false }).why).toBe('No night of this season is dark enough at this site.')
  })

  it('the Moon is named where its limits were asked', () => {
    expect(asked({ isMoonLimited: true }).why).toContain('within the Moon limits')
  })
})
