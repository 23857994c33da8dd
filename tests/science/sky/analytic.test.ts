import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  airmassYoung1994,
  altitudeOfAirmassDeg,
  eveningDateAt,
  moonAltitudeDeg,
  moonlitSkyV,
  moonIlluminationAt,
  moonSeparationDeg,
  nightAt,
  positionsAt,
  seasonGrid,
  sunAltitudeDeg,
  visibility,
} from '../../../lib/science/sky'
import { intersect, without, totalDays, type Interval } from '../../../lib/science/sky/intervals'

const ridge = { latitudeDeg: -37.4, longitudeDeg: -70.2, elevationM: 2390 }
const target = { id: 'Fornax', raDeg: 53.1, decDeg: -27.8 }
/** Never sets at 37.4 S. */
const polar = { id: 'polar', raDeg: 10, decDeg: -85 }

describe('analytic limit or identity', () => {
  it('airmass: 1 overhead, the secant high up, its inverse everywhere', () => {
    expect(airmassYoung1994(90)).toBeCloseTo(1, 6)
    for (const altitude of [45, 60, 80]) {
      expect(airmassYoung1994(altitude)).toBeCloseTo(1 / Math.sin((altitude * Math.PI) / 180), 2)
      expect(altitudeOfAirmassDeg(airmassYoung1994(altitude) ?? 0)).toBeCloseTo(altitude, 6)
    }
    expect(altitudeOfAirmassDeg(1)).toBe(90)
    expect(airmassYoung1994(-0.1)).toBeNull()
    expect(() => altitudeOfAirmassDeg(0.9)).toThrow('An airmass lies between 1 and 31.7.')
    expect(() => altitudeOfAirmassDeg(NaN)).toThrow('An airmass lies between 1 and 31.7.')
  })

  it('at sunset the Sun stands 50 arcminutes under the horizon, at twilight 6, 12 and 18 degrees', () => {
    const night = nightAt(ridge, '2027-08-14')
    const at = (moment: Date | null): number => sunAltitudeDeg(ridge, moment ?? new Date(NaN))
    expect(at(night.sunset)).toBeCloseTo(-50 / 60, 3)
    expect(at(night.sunrise)).toBeCloseTo(-50 / 60, 3)
    expect(at(night.eveningTwilight.civil)).toBeCloseTo(-6, 3)
    expect(at(night.morningTwilight.nautical)).toBeCloseTo(-12, 3)
    expect(at(night.eveningTwilight.astronomical)).toBeCloseTo(-18, 3)
    for (const [from, to] of night.moonUp) {
      const middle = new Date((from.getTime() + to.getTime()) / 2)
      expect(moonAltitudeDeg(ridge, middle)).toBeGreaterThan(0)
    }
  })

  it('windows are exactly where a search by the minute finds them', () => {
    // An independent path through the same ephemeris: every minute of three nights, all limits at once.
    const moon = { maxIllumination: 0.3, minSeparationDeg: 60 }
    const asked = {
      site: ridge,
      targets: [target],
      from: '2027-10-08',
      to: '2027-10-10',
      maxAirmass: 1.6,
      moon,
    }
    const { targets } = visibility(asked)
    const lowest = altitudeOfAirmassDeg(1.6)
    let minutes = 0
    const start = new Date('2027-10-08T16:00:00Z').getTime()
    for (let minute = 0; minute < 3 * 1440; minute += 1) {
      const at = new Date(start + minute * 60_000)
      const [now] = positionsAt({ site: ridge, targets: [target], instants: [at] })
      const here = now?.targets[0]
      if (!now || !here) throw new Error('No position')
      const moonHurts = now.moonAltitudeDeg > 0 && (now.moonIllumination > 0.3 || here.moonSeparationDeg < 60)
      if (now.sunAltitudeDeg < -18 && here.altitudeDeg > lowest && !moonHurts) minutes += 1
    }
    // Each of at most a dozen edges is found to a minute by the search.
    expect(Math.abs((targets[0]?.totalHours ?? 0) * 60 - minutes)).toBeLessThan(6)
    expect(minutes).toBeGreaterThan(150)
  })

  it('a target that never sets is up all night, one that never rises never, and opposite latitudes agree', () => {
    const other = { id: 'other', raDeg: 10, decDeg: 85 }
    const asked = {
      site: ridge,
      targets: [polar, other],
      from: '2027-07-01',
      to: '2027-07-03',
      maxAirmass: 3,
    }
    const { nights, targets } = visibility(asked)
    for (const [i, night] of nights.entries()) {
      expect(targets[0]?.byNight[i]).toBeCloseTo(night.darkHours, 9)
      expect(targets[1]?.byNight[i]).toBe(0)
      expect(targets[1]?.windows[i]).toEqual([])
    }
  })

  it('at a pole every altitude is the declination', () => {
    const pole = { latitudeDeg: 90, longitudeDeg: 0, elevationM: 0 }
    const asked = {
      site: pole,
      targets: [{ id: 'a', raDeg: 200, decDeg: 40 }],
      from: '2027-12-20',
      to: '2027-12-22',
    }
    const { targets, nights } = visibility({ ...asked, maxAirmass: 1.7 })
    expect(nights.map((night) => night.polar)).toEqual(['night', 'night', 'night'])
    expect(targets[0]?.byNight.map((hours) => Math.round(hours))).toEqual([24, 24, 24])
    expect(visibility({ ...asked, maxAirmass: 1.2 }).targets[0]?.totalHours).toBe(0)
  })

  it('with the Moon to be below, what is left is the dark less the hours it is up', () => {
    const asked = { site: ridge, targets: [polar], from: '2027-08-10', to: '2027-08-20', maxAirmass: 3 }
    const below = visibility({ ...asked, moon: { below: true } })
    for (const [i, night] of below.nights.entries()) {
      const [from, to] = [night.darkFrom?.getTime() ?? 0, night.darkTo?.getTime() ?? 0]
      const up = night.moonUp.reduce((sum, [rise, set]) => {
        return sum + Math.max(0, Math.min(to, set.getTime()) - Math.max(from, rise.getTime())) / 3.6e6
      }, 0)
      expect(below.targets[0]?.byNight[i]).toBeCloseTo(night.darkHours - up, 5)
    }
    // At most a thousandth lit is the same as below, but for the nights of new Moon.
    const unlit = visibility({ ...asked, moon: { maxIllumination: 0.001 } })
    expect(unlit.targets[0]?.totalHours).toBeCloseTo(below.targets[0]?.totalHours ?? 0, 5)
  })

  it('the lowest altitude of the telescope counts where the airmass limit lies lower', () => {
    const asked = { site: ridge, targets: [target], from: '2027-10-08', to: '2027-10-08' }
    const byAltitude = visibility({ ...asked, maxAirmass: 5, lowestAltitudeDeg: altitudeOfAirmassDeg(1.5) })
    const byAirmass = visibility({ ...asked, maxAirmass: 1.5, lowestAltitudeDeg: 10 })
    expect(byAltitude.targets).toEqual(byAirmass.targets)
    expect(byAirmass.targets[0]?.totalHours).toBeGreaterThan(1)
  })

  it('a blind spot overhead takes its time out of the middle', () => {
    const overhead = { id: 'overhead', raDeg: 330, decDeg: -37.4 }
    const asked = { site: ridge, targets: [overhead], from: '2027-08-01', to: '2027-08-01', maxAirmass: 2 }
    const [whole] = visibility(asked).targets
    const [split] = visibility({ ...asked, highestAltitudeDeg: 87 }).targets
    expect(whole?.windows[0]).toHaveLength(1)
    expect(split?.windows[0]).toHaveLength(2)
    // 3 degrees on both sides of the zenith at 15 degrees an hour times cos(dec).
    const lost = (whole?.totalHours ?? 0) - (split?.totalHours ?? 0)
    expect(lost).toBeCloseTo(6 / 15.04 / Math.cos((37.4 * Math.PI) / 180), 2)
  })

  it('moonlight: none below the horizon, more towards the Moon, the sky twice as bright at airmass two', () => {
    const sky = {
      phaseAngleDeg: 0,
      separationDeg: 60,
      moonAltitudeDeg: 45,
      targetAltitudeDeg: 60,
      extinctionV: 0.172,
      darkZenithV: 21.587,
    }
    const dark = moonlitSkyV({ ...sky, moonAltitudeDeg: -5 })
    expect(moonlitSkyV({ ...sky, moonAltitudeDeg: -5, targetAltitudeDeg: 90 })).toBeCloseTo(21.587, 9)
    expect(moonlitSkyV(sky)).toBeLessThan(dark - 2)
    expect(moonlitSkyV({ ...sky, separationDeg: 20 })).toBeLessThan(moonlitSkyV(sky))
    expect(moonlitSkyV({ ...sky, phaseAngleDeg: 90 })).toBeGreaterThan(moonlitSkyV(sky) + 1)
    // The paper rounds 0.4 ln 10 to 0.92104: 5e-6.
    const twice = moonlitSkyV({ ...sky, moonAltitudeDeg: -5, targetAltitudeDeg: 30, extinctionV: 0 })
    expect(21.587 - twice).toBeCloseTo(2.5 * Math.log10((1 - 0.96 * 0.75) ** -0.5), 4)
  })

  it('separation, illumination and season grid agree with positions', () => {
    const at = new Date('2027-09-10T03:00:00Z')
    const [now] = positionsAt({ site: ridge, targets: [target], instants: [at] })
    expect(moonSeparationDeg(ridge, target, at)).toBeCloseTo(now?.targets[0]?.moonSeparationDeg ?? 0, 9)
    expect(moonIlluminationAt(at)).toBeCloseTo(now?.moonIllumination ?? 0, 9)
    const grid = seasonGrid(ridge, '2027-09-09', '2027-09-09', -3)
    // 3h UTC is midnight at the site: hour 24.
    expect(grid.nights[0]?.sunAltitudesDeg[grid.hours.indexOf(24)]).toBeCloseTo(now?.sunAltitudeDeg ?? 0, 4)
    expect(grid.nights[0]?.sunsetHour).toBeGreaterThan(18)
    expect(grid.nights[0]?.sunriseHour).toBeLessThan(32)
  })

  it('the evening date turns at sunrise', () => {
    const { sunrise } = nightAt(ridge, '2027-07-01')
    const before = new Date((sunrise?.getTime() ?? 0) - 1000)
    const after = new Date((sunrise?.getTime() ?? 0) + 1000)
    expect(eveningDateAt(ridge, before)).toBe('2027-07-01')
    expect(eveningDateAt(ridge, after)).toBe('2027-07-02')
    expect(eveningDateAt(ridge, new Date('2027-07-02T15:00:00Z'))).toBe('2027-07-02')
  })

  it('intervals: what two lists share and what is left add up', () => {
    const list = fc
      .uniqueArray(fc.integer({ min: 0, max: 100 }), { minLength: 0, maxLength: 12 })
      .map((cuts) => [...cuts].sort((a, b) => a - b))
      .map((cuts) =>
        cuts.flatMap((from, i): Interval[] => {
          const to = cuts[i + 1]
          return i % 2 === 0 && to !== undefined ? [[from, to]] : []
        }),
      )
    fc.assert(
      fc.property(list, list, (a, b) => {
        expect(totalDays(intersect(a, b)) + totalDays(without(a, b))).toBeCloseTo(totalDays(a), 9)
        expect(intersect(without(a, b), b)).toEqual([])
      }),
    )
  })
})
