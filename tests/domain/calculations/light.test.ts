import { describe, expect, it } from 'vitest'
import { lightAnswer } from '@/lib/domain/calculations/answers'
import { computeLight } from '@/lib/domain/calculations/computeLight'
import { observeLightRequest } from '@/lib/domain/calculations/observeLightSchema'
import { Refusal } from '@/lib/errors'
import { fieldErrorsOf } from '@/lib/fieldErrorsOf'

// Einstein and de Sitter: D_L = (2c/H0) (1+z) (1 - 1/sqrt(1+z)), here 17,131 Mpc at z = 3.
const universe = { H0: 70, Om0: 1, Ode0: 0 }
const luminosityMpc = ((2 * 299_792.458) / 70) * 4 * 0.5
const observe = (over: object) =>
  computeLight(observeLightRequest.parse({ cosmology: universe, z: 3, ...over }))

function refusedFields(over: object): string[] {
  try {
    observe(over)
  } catch (error) {
    if (error instanceof Refusal) return Object.keys(error.fieldErrors)
    throw error
  }
  return expect.fail('it was not refused')
}

describe('light from a redshift', () => {
  it('is a magnitude of parts that add up', () => {
    const seen = observe({
      absoluteMagnitudeAb: -22,
      spectralIndex: -0.5,
      magnitudeWavelengthA: 5470,
      ebv: 0.2,
      magnification: 10,
      magnificationError: 2,
    }).magnitude
    const modulus = 5 * Math.log10(luminosityMpc) + 25
    expect(seen?.distanceModulusMag).toBeCloseTo(modulus, 6)
    // Hogg et al. 2002, eq. 12.
    expect(seen?.kCorrectionMag).toBeCloseTo(-2.5 * 0.5 * Math.log10(4), 10)
    // Fitzpatrick 1999, table 3: A/E(B-V) = 3.055 at 5470 A.
    expect(seen?.dustMag).toBeCloseTo(0.2 * 3.055, 4)
    expect(seen?.magnificationMag).toBeCloseTo(-2.5, 10)
    // (2.5 / ln 10) sigma / mu.
    expect(seen?.errorMag).toBeCloseTo(0.217147, 5)
    expect(seen?.withoutDustOrLensAb).toBeCloseTo(-22 + modulus - 1.25 * Math.log10(4), 6)
    expect(seen?.apparentAb).toBeCloseTo((seen?.withoutDustOrLensAb ?? 0) + 0.611 - 2.5, 4)
  })

  it('recalibrates reddening of the map of 1998 only where it is said to be of it', () => {
    const dust = (ebvIsSfd: boolean) =>
      observe({ absoluteMagnitudeAb: -22, magnitudeWavelengthA: 5470, ebv: 1, ebvIsSfd }).magnitude?.dustMag
    expect((dust(true) ?? 0) / (dust(false) ?? 1)).toBeCloseTo(0.86, 10)
  })

  it('is a line flux of L / (4 pi D_L^2), dimmed by dust and raised by a lens', () => {
    const cm = luminosityMpc * 3.085_677_581_491_367e24
    const bare = observe({ lineLuminosityErgS: 1e43 }).line
    expect((bare?.fluxErgSCm2 ?? 0) / (1e43 / (4 * Math.PI * cm * cm))).toBeCloseTo(1, 8)
    expect(bare?.observedWavelengthA).toBeNull()
    const seen = observe({
      lineLuminosityErgS: 1e43,
      lineRestWavelengthA: 1215.67,
      ebv: 0.1,
      magnification: 4,
    }).line
    expect(seen?.observedWavelengthA).toBeCloseTo(4862.68, 6)
    expect((seen?.fluxErgSCm2 ?? 0) / (bare?.fluxErgSCm2 ?? 1)).toBeCloseTo(
      4 * 10 ** (-0.4 * (seen?.dustMag ?? 0)),
      10,
    )
  })

  it('dims surfaces by 10 log10(1+z), and by 7.5 log10(1+z) a unit of frequency', () => {
    const { dimming } = observe({})
    expect(dimming.bolometricMag).toBeCloseTo(10 * Math.log10(4), 10)
    expect(dimming.perFrequencyMag).toBeCloseTo(7.5 * Math.log10(4), 10)
  })

  it('is let through by dust and by the intergalactic medium, wavelength by wavelength', () => {
    const { rows } = observe({
      restWavelengthsA: [1300, 1000],
      observedWavelengthsA: [3500],
      ebv: 0.1,
    })
    expect(rows.map(({ observedA }) => observedA)).toEqual([5200, 4000, 3500])
    expect(rows.map(({ restA }) => restA)).toEqual([1300, 1000, 875])
    // Nothing absorbs redward of Lyman alpha; below it lines do, below the limit also the continuum.
    expect(rows[0]?.throughIgm).toBe(1)
    expect(rows[1]?.throughIgm).toBeLessThan(0.8)
    expect(rows[2]?.throughIgm).toBeLessThan(rows[1]?.throughIgm ?? 0)
    for (const row of rows) expect(row.through).toBeCloseTo(row.throughDust * row.throughIgm, 12)
  })

  it('carries what was measured in a band to each wavelength, dust and gas counted once', () => {
    const at = (over: object) =>
      observe({
        measured: { ab: 22, band: 'i', spectrum: { kind: 'power-law', index: -0.5 } },
        observedWavelengthsA: [16_620, 4500],
        ...over,
      }).rows.map(({ ab }) => ab ?? NaN)
    const [red = NaN, blue = NaN] = at({})
    expect(red).toBeCloseTo(22 - 1.25 * Math.log10(16_620 / 7672), 2)
    // Lyman alpha stands at 4863 A: the gas dims what lies bluewards of it, and nothing in i.
    const through = observe({ observedWavelengthsA: [4500] }).rows[0]?.throughIgm ?? NaN
    expect(blue).toBeCloseTo(22 - 1.25 * Math.log10(4500 / 7672) - 2.5 * Math.log10(through), 2)
    const [dusty = NaN] = at({ ebv: 0.5 })
    // Fitzpatrick 1999: A/E(B-V) near 1.9 in i and 0.5 in H.
    expect(dusty - red).toBeLessThan(-0.6)
    expect(dusty - red).toBeGreaterThan(-0.8)
    expect(observe({ observedWavelengthsA: [5000] }).rows[0]?.ab).toBeNull()
  })

  it('has the Einstein radius of a lens before the source', () => {
    // 4 pi (sigma/c)^2 D_LS/D_S; between comoving distances of a flat universe D_LS/D_S = 1 - D_L/D_S.
    const share = 1 - (1 - 1 / Math.sqrt(1.5)) / 0.5
    const radius = 4 * Math.PI * (250 / 299_792.458) ** 2 * share * 206_264.806
    expect(observe({ lens: { z: 0.5, dispersionKmS: 250 } }).einsteinRadiusArcsec).toBeCloseTo(radius, 6)
  })

  it('is answered as described', () => {
    for (const over of [
      {},
      { absoluteMagnitudeAb: -20, lineLuminosityErgS: 1e40, sizeKpc: 3, restWavelengthsA: [1200] },
      {
        measured: { ab: 22, band: 'i', spectrum: { kind: 'black-body', temperatureK: 9000 } },
        observedWavelengthsA: [9000],
      },
    ]) {
      const found = JSON.parse(JSON.stringify(observe(over))) as unknown
      expect(lightAnswer.parse(found)).toEqual(found)
    }
  })

  it.each([
    ['no distance', { z: 0 }, ['z']],
    ['a redshift the universe does not have', { cosmology: { H0: 70, Om0: 0.3, Ode0: 1.75 } }, ['z']],
    [
      'dust on a magnitude of no wavelength',
      { absoluteMagnitudeAb: -20, ebv: 0.1 },
      ['magnitudeWavelengthA'],
    ],
    ['dust on a line of no wavelength', { lineLuminosityErgS: 1e40, ebv: 0.1 }, ['lineRestWavelengthA']],
    [
      'dust where its law does not reach',
      { ebv: 0.1, restWavelengthsA: [1200, 9000], observedWavelengthsA: [900] },
      ['restWavelengthsA.1', 'observedWavelengthsA.0'],
    ],
    [
      'a spectrum without light in its band',
      { measured: { ab: 20, band: 'u', spectrum: { kind: 'black-body', temperatureK: 100 } } },
      ['measured'],
    ],
    ['a lens behind the source', { lens: { z: 4, dispersionKmS: 200 } }, ['lens']],
    ['a magnification of 0', { magnification: 0 }, ['magnification']],
    ['a negative error of it', { magnificationError: -1 }, ['magnificationError']],
  ])('refuses %s at its place', (_, over, fields) => {
    expect(refusedFields(over)).toEqual(fields)
  })

  it.each([
    ['a misspelt member', { ebV: 0.1 }, { form: 'Nothing here is called “ebV”.' }],
    ['a prototype', JSON.parse('{"__proto__":{"ebv":1}}'), { form: 'Nothing here is called “__proto__”.' }],
    ['text for a number', { z: '3' }, { z: 'A redshift is a number.' }],
    ['infinity', { z: Infinity }, { z: 'A redshift is a number.' }],
    ['a list for an object', { lens: [] }, { lens: 'Give an object of JSON.' }],
  ])('does not take %s', (_, over: object, errors) => {
    const body = Object.defineProperties(
      { cosmology: universe, z: 3 },
      Object.getOwnPropertyDescriptors(over),
    )
    const read = observeLightRequest.safeParse(body)
    expect(read.error && fieldErrorsOf(read.error)).toEqual(errors)
  })

  it('counts wavelengths before it looks at them', () => {
    const observedWavelengthsA = Array.from({ length: 10_001 }, () => 'wrong')
    expect(() => observe({ observedWavelengthsA })).toThrow('one call takes at most 10,000')
  })
})
