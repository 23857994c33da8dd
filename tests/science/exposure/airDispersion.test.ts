import { describe, expect, it } from 'vitest'
import { airAt, airDispersionArcsec, exposure } from '../../../lib/science/exposure'
import { dark, slit } from '../support/instruments'

const wavelengths = [3000, 3500, 4000, 4500, 5000, 5500, 6000, 7000, 8000, 10_000]

// Seen to fail with sin z for tan z, and with the vapour added instead of taken away.
describe('published value: Filippenko 1982, table 1 (600 mm Hg, 7 C, 8 mm Hg of vapour), against 5000 A', () => {
  const air = { pressureMmHg: 600, temperatureC: 7, waterMmHg: 8 }
  it.each([
    [1.05, [0.68, 0.38, 0.2, 0.08, 0, -0.06, -0.11, -0.17, -0.21, -0.26]],
    [1.5, [2.37, 1.34, 0.71, 0.29, 0, -0.21, -0.37, -0.6, -0.74, -0.91]],
  ])('at airmass %s', (airmass, published) => {
    const found = wavelengths.map((w) => airDispersionArcsec(w, 5000, airmass, air))
    found.forEach((value, i) => expect(value).toBeCloseTo(published[i] ?? NaN, 2))
  })
})

describe('analytic limit or identity', () => {
  it('nothing at the zenith, nothing against itself, and one wavelength against another turns its sign', () => {
    const air = airAt(2390)
    expect(airDispersionArcsec(3600, 7000, 1, air)).toBe(0)
    expect(airDispersionArcsec(5000, 5000, 2, air)).toBe(0)
    expect(airDispersionArcsec(3600, 7000, 2, air)).toBe(-airDispersionArcsec(7000, 3600, 2, air))
  })

  it('the standard atmosphere: 760 mm Hg and 15 C at the sea, 570 mm Hg and -0.5 C at 2,390 m (ISO 2533)', () => {
    expect(airAt(0)).toMatchObject({ pressureMmHg: 760, temperatureC: 15 })
    expect(airAt(2390).pressureMmHg).toBeCloseTo(567.9, 0)
    expect(airAt(2390).temperatureC).toBeCloseTo(-0.54, 2)
  })

  it('costs time across the slit, none along it, none behind prisms', () => {
    const source = {
      kind: 'magnitude',
      ab: 20,
      wavelengthA: 3800,
      geometry: { kind: 'point' },
      provenance: 'observed',
    } as const
    const hours = (change: object, mode = slit): number =>
      exposure({
        mode,
        source,
        conditions: { ...dark, airmass: 1.8, ...change },
        solve: 'time',
        snr: 5,
      }).openS
    expect(hours({ slitAngle: 'across' })).toBeGreaterThan(2 * hours({}))
    expect(hours({ slitAngle: 'across' }, { ...slit, dispersionCorrected: true })).toBe(hours({}))
    expect(hours({ slitAngle: 'across', guideWavelengthA: 3800 })).toBe(hours({}))
  })
})
