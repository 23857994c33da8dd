import { describe, expect, it } from 'vitest'
import { presetCosmology } from '../../../lib/science/cosmology'
import {
  abPhotonRate,
  airToVacuumA,
  bands,
  findBand,
  lineFlux,
  linePhotonRate,
  nearestBandValue,
  observeLight,
  restLines,
  toAb,
  vacuumToAirA,
} from '../../../lib/science/light'
import { fixture } from '../support/fixture'
import { relativeError } from '../support/relativeError'

interface Photons {
  source: string
  photons: { ab: number; wavelengthA: number; rate: number }[]
  linePhotons: { fluxErgSCm2: number; wavelengthA: number; rate: number }[]
}

const table = fixture<Photons>('exposure')
const planck = presetCosmology('planck-2018')

describe('published value', () => {
  it.each([
    // Air and vacuum wavelengths of well-known lines, Vanden Berk et al. 2001 and NIST; rounding of the lists.
    [4861.33, 4862.68],
    [4958.91, 4960.295],
    [5006.84, 5008.24],
    [6562.8, 6564.61],
    [6716.44, 6718.29],
  ])('%d A in air is %d A in vacuum', (air, vacuum) => {
    expect(Math.abs(airToVacuumA(air) - vacuum)).toBeLessThan(0.02)
    expect(Math.abs(vacuumToAirA(vacuum) - air)).toBeLessThan(0.02)
  })

  it('a star of V = 0 sends some 1000 photons/s/cm^2/A at 5500 A', () => {
    // Bessell 1979, PASP 91, 589: 1005 at V = 0; zero-points of the scales differ by 2 %.
    expect(relativeError(abPhotonRate(toAb(0, 'Vega', 'V'), 5450), 1005)).toBeLessThan(0.03)
  })

  it('AB and ST agree at 5478 A', () => {
    // By definition of the two zero-points (Oke & Gunn 1983; Koornneef et al. 1986): 5477 to 5479 A.
    expect(toAb(20, 'ST', 'V') - 20 + 5 * Math.log10(findBand('V').wavelengthA / 5478)).toBeCloseTo(0, 2)
  })
})

describe(`independent code: ${table.source}`, () => {
  it.each(table.photons)('photons of AB $ab at $wavelengthA A', ({ ab, wavelengthA, rate }) => {
    // Astropy's AB zero-point is exactly 3631 Jy after rounding of its ABflux: 1e-4.
    expect(relativeError(abPhotonRate(ab, wavelengthA), rate)).toBeLessThan(1e-4)
  })

  it.each(table.linePhotons)('photons of a line at $wavelengthA A', ({ fluxErgSCm2, wavelengthA, rate }) => {
    expect(relativeError(linePhotonRate(fluxErgSCm2, wavelengthA), rate)).toBeLessThan(1e-12)
  })
})

describe('analytic limit or identity', () => {
  it('air to vacuum and back is exact; ultraviolet is left alone', () => {
    for (const wavelengthA of [2000.7, 3728, 6565, 21_661, 1e5]) {
      expect(relativeError(vacuumToAirA(airToVacuumA(wavelengthA)), wavelengthA)).toBeLessThan(1e-14)
    }
    expect([airToVacuumA(1216), vacuumToAirA(1216)]).toEqual([1216, 1216])
    expect(() => airToVacuumA(-1)).toThrow('A wavelength must be above 0 Å.')
  })

  it('what reaches us: magnitude, flux, size, wavelengths', () => {
    const z = 1
    const seen = observeLight({
      cosmology: planck,
      z,
      absoluteMagnitudeAb: -21,
      spectralIndex: -1,
      lineLuminosityErgS: 1e42,
      sizeKpc: planck.kpcPerArcsec(z) * 2,
      restWavelengthsA: [3728.48, 6564.61],
    })
    // alpha = -1: no K correction at all.
    expect(seen.kCorrectionMag).toBeCloseTo(0, 12)
    expect(seen.apparentMagnitudeAb).toBeCloseTo(-21 + planck.distanceModulusMag(z), 9)
    expect(seen.angularSizeArcsec).toBeCloseTo(2, 12)
    expect(seen.observedWavelengthsA).toEqual([3728.48 * 2, 6564.61 * 2])
    expect(seen.dimmingMag).toBeCloseTo(10 * Math.log10(2), 12)
    const mpcCm = 3.085677581491367e24
    const sphere = 4 * Math.PI * (planck.luminosityMpc(z) * mpcCm) ** 2
    expect(relativeError(seen.lineFluxErgSCm2 ?? 0, 1e42 / sphere)).toBeLessThan(1e-12)
    expect(lineFlux(1e42, 1000)).toBeCloseTo(4 * lineFlux(1e42, 2000), 25)
  })

  it('what is not asked is not answered, and z = 0 is refused', () => {
    const seen = observeLight({ cosmology: planck, z: 0.5 })
    expect([seen.apparentMagnitudeAb, seen.lineFluxErgSCm2, seen.angularSizeArcsec]).toEqual([
      null,
      null,
      null,
    ])
    expect(seen.kCorrectionMag).toBeCloseTo(-2.5 * Math.log10(1.5), 12)
    expect(() => observeLight({ cosmology: planck, z: 0 })).toThrow('needs a redshift above 0')
  })

  it('per-band tables: the band named, else the nearest', () => {
    const values = { g: 1, r: 2, K: 3, odd: 4 }
    expect(nearestBandValue(values, 5000, 'K')).toEqual({ band: 'K', value: 3 })
    expect(nearestBandValue(values, 5000, null)).toEqual({ band: 'g', value: 1 })
    expect(nearestBandValue(values, 18_000, 'H')).toEqual({ band: 'K', value: 3 })
    expect(nearestBandValue({ odd: 4 }, 5000, null)).toBeNull()
    expect(() => findBand('Q')).toThrow('No band is called “Q”.')
  })

  it('lines have their own names and rise in wavelength', () => {
    expect(new Set(restLines.map(({ id }) => id)).size).toBe(restLines.length)
    expect(restLines.every((l, i) => i === 0 || l.vacuumA > (restLines[i - 1]?.vacuumA ?? Infinity))).toBe(
      true,
    )
    expect(Object.values(bands).every((band) => band.wavelengthA > 3000)).toBe(true)
  })
})
