import { describe, expect, it } from 'vitest'
import { skyAbArcsec2 } from '../../../lib/science/exposure/skyBrightness'
import type { MoonClass, SiteRecord } from '../../../lib/science/exposure/types'
import { findBand } from '../../../lib/science/light'
import { ridge } from '../support/instruments'

/** Walker 1987 (NOAO Newsletter 10, 16), Vega magnitudes per square arcsecond 0, 7 and 14 days from new Moon; from memory. */
const walker = {
  dark: { U: 22.0, B: 22.7, V: 21.8, R: 20.9, I: 19.9 },
  grey: { U: 19.9, B: 21.6, V: 21.4, R: 20.6, I: 19.7 },
  bright: { U: 17.0, B: 19.5, V: 20.0, R: 19.9, I: 19.2 },
} as const
type Letter = keyof typeof walker.dark
const letters = Object.keys(walker.dark) as Letter[]

/** The same site: its own dark sky, and the extinction of a good one (common practice). */
const site: SiteRecord = {
  ...ridge,
  darkSkyMagArcsec2: Object.fromEntries(letters.map((b) => [b, walker.dark[b] + findBand(b).vegaAb])),
  extinctionMagPerAirmass: { U: 0.5, B: 0.25, V: 0.14, R: 0.1, I: 0.06 },
}
const vega = (band: Letter, moon: MoonClass, airmass = 1): number =>
  skyAbArcsec2(site, findBand(band).wavelengthA, band, moon, airmass).ab - findBand(band).vegaAb

describe('published value: the sky of Walker 1987', () => {
  it.each(letters)('the dark zenith of %s is the record', (band) => {
    expect(vega(band, 'dark')).toBeCloseTo(walker.dark[band], 9)
  })

  // Measured skies are up to a magnitude brighter than his with a Moon up (Patat 2003, A&A 400, 1183, section 7).
  it.each(letters.flatMap((band) => (['grey', 'bright'] as const).map((moon) => [band, moon] as const)))(
    '%s in %s time is never 1.2 mag from his',
    (band, moon) => {
      expect(Math.abs(vega(band, moon) - walker[moon][band])).toBeLessThan(1.2)
    },
  )

  it('from B to I moonlight costs the less the redder the band, as in his table', () => {
    for (const moon of ['grey', 'bright'] as const) {
      const lost = (['B', 'V', 'R', 'I'] as const).map((band) => vega(band, 'dark') - vega(band, moon))
      expect([...lost].sort((a, b) => b - a)).toEqual(lost)
    }
  })
})

describe('analytic limit or identity', () => {
  it('the dark sky at airmass 2 is brighter by its path and dimmer by what the air takes', () => {
    // Krisciunas & Schaefer 1991, eq. 2, with the path of eq. 3: sin^2 z = (1 - 1/4)/0.96, so X = 2.
    expect(vega('V', 'dark') - vega('V', 'dark', 2)).toBeCloseTo(2.5 * Math.log10(2) - 0.14, 6)
  })
})
