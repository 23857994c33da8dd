import { describe, expect, it } from 'vitest'
import { deliveredImageArcsec, skyAbArcsec2 } from '../../../lib/science/exposure'
import { ridge } from '../support/instruments'

describe('analytic limit or identity', () => {
  it('the image grows with airmass and shrinks to the red; the outer scale and diffraction join in', () => {
    const at = (change: object): number =>
      deliveredImageArcsec({
        seeingArcsec: 0.8,
        airmass: 1,
        wavelengthA: 5000,
        collectingAreaM2: 10,
        ...change,
      })
    // Tokovinin 2002, eq. 19: r0 = 0.1259 m, L0 = 20 m: 0.8 sqrt(1 - 2.183 (r0/L0)^0.356) = 0.641.
    expect(at({})).toBeCloseTo(Math.hypot(0.641, 0.0298), 2)
    expect(at({ airmass: 2 }) / at({})).toBeGreaterThan(2 ** 0.6)
    expect(at({ airmass: 2 }) / at({})).toBeLessThan(2 ** 0.6 * 1.1)
    expect(at({ wavelengthA: 20_000 })).toBeLessThan(at({}))
    expect(at({ opticsArcsec: 3 })).toBeGreaterThan(3)
    expect(() => at({ seeingArcsec: 0 })).toThrow('The seeing lies above 0 and below 20 arcseconds.')
    expect(() => at({ airmass: 0.9 })).toThrow('An airmass lies between 1 and 40.')
  })

  it('dark sky is the site’s own at the zenith, brighter lower down and with a Moon, blue most of all', () => {
    const sky = (band: string, wavelengthA: number, moon: 'dark' | 'grey' | 'bright', airmass = 1): number =>
      skyAbArcsec2(ridge, wavelengthA, band, moon, airmass).ab
    expect(sky('r', 6261, 'dark')).toBeCloseTo(21.3, 9)
    expect(sky('r', 6261, 'dark', 2)).toBeLessThan(21.3 - 0.5)
    for (const [band, wavelengthA] of [
      ['g', 4825],
      ['r', 6261],
      ['i', 7672],
    ] as const) {
      expect(sky(band, wavelengthA, 'grey')).toBeLessThan(sky(band, wavelengthA, 'dark'))
      expect(sky(band, wavelengthA, 'bright')).toBeLessThan(sky(band, wavelengthA, 'grey'))
    }
    const loss = (band: string, at: number): number => sky(band, at, 'dark') - sky(band, at, 'bright')
    expect(loss('g', 4825)).toBeGreaterThan(loss('i', 7672) + 1)
    expect(loss('J', 12_350)).toBeLessThan(0.1)
    const empty = { ...ridge, darkSkyMagArcsec2: {} }
    expect(() => skyAbArcsec2(empty, 6000, 'r', 'dark', 1)).toThrow('The site has no sky brightness')
  })
})
