import { describe, expect, it } from 'vitest'
import {
  darkSeconds,
  localSiderealHours,
  moonAltitudeDeg,
  moonIlluminationAt,
  nightAt,
  nightPieces,
} from '../../../lib/science/sky'
import { ridge } from '../support/instruments'

const dates = Array.from({ length: 61 }, (_, i) =>
  new Date(Date.UTC(2027, 7, 1 + i)).toISOString().slice(0, 10),
)
const nights = dates.map((date) => ({ date, from: 0, to: 1 }))
const moonClasses = [0.25, 0.65]
const pieces = nightPieces({ site: ridge, nights, moonClasses })
const hoursOf = (some: typeof pieces) =>
  some.reduce((sum, { from, to }) => sum + (to.getTime() - from.getTime()) / 3_600_000, 0)

describe('analytic limit or identity: the pieces of a night', () => {
  it.each([0, 9, 23, 40, 60])('of night %s are its dark time, without gap or overlap', (night) => {
    const own = pieces.filter((piece) => piece.night === night).sort((a, b) => +a.from - +b.from)
    const whole = nightAt(ridge, dates[night] ?? '')
    // Moments are whole milliseconds.
    expect(hoursOf(own)).toBeCloseTo(whole.darkHours, 5)
    expect(Math.abs(+(own[0]?.from ?? 0) - +(whole.darkFrom ?? 0))).toBeLessThan(2)
    own.slice(1).forEach(({ from }, i) => expect(Math.abs(+from - +(own[i]?.to ?? 0))).toBeLessThan(2))
  })

  it('each lies in its two hours of sidereal time', () => {
    expect(pieces.length).toBeGreaterThan(300)
    for (const { from, to, siderealFromH } of pieces) {
      const at = localSiderealHours(ridge, new Date((+from + +to) / 2))
      expect(Math.floor(at / 2) * 2).toBe(siderealFromH)
    }
  })

  it('each lies in its class of moonlight', () => {
    expect(new Set(pieces.map(({ moonClass }) => moonClass))).toEqual(new Set([0, 1, 2]))
    for (const { from, to, moonClass } of pieces) {
      if (+to - +from < 120_000) continue
      const middle = new Date((+from + +to) / 2)
      // Rising is where the centre stands on the horizon, without refraction.
      const lit = moonAltitudeDeg(ridge, middle) > 0 ? moonIlluminationAt(middle) : 0
      expect(moonClasses.filter((most) => lit > most).length).toBe(moonClass)
    }
  })

  it('a fraction of the night is that fraction of its hours', () => {
    const half = nightPieces({
      site: ridge,
      nights: [{ date: '2027-08-20', from: 0.25, to: 0.75 }],
      moonClasses,
    })
    expect(hoursOf(half)).toBeCloseTo(nightAt(ridge, '2027-08-20').darkHours / 2, 5)
  })

  it('a night that is never dark has none', () => {
    const north = { ...ridge, latitudeDeg: 69.7, longitudeDeg: 18.9 }
    expect(
      nightPieces({ site: north, nights: [{ date: '2027-06-21', from: 0, to: 1 }], moonClasses }),
    ).toEqual([])
  })
})

describe('analytic limit or identity: the dark time of a part of a night', () => {
  it('is that of the whole night, to the second, and its parts add up to it', () => {
    for (const date of ['2027-08-20', '2027-12-21']) {
      const whole = nightAt(ridge, date).darkHours * 3600
      expect(Math.abs(darkSeconds({ site: ridge, date }) - whole)).toBeLessThanOrEqual(0.5)
      const parts = [
        [0, 0.25],
        [0.25, 0.5],
        [0.5, 1],
      ].map(([from, to]) => darkSeconds({ site: ridge, date, from, to }))
      expect(Math.abs(parts.reduce((sum, part) => sum + part, 0) - whole)).toBeLessThanOrEqual(2)
      expect(Math.abs((parts[2] ?? 0) - whole / 2)).toBeLessThanOrEqual(1)
    }
  })

  it('is none where the Sun does not sink so far', () => {
    expect(darkSeconds({ site: { ...ridge, latitudeDeg: 60 }, date: '2027-06-21' })).toBe(0)
  })
})
