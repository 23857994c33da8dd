import { describe, expect, it } from 'vitest'
import { einsteinRadiusArcsec, magnifiedMag, powerLawK, spectrumK } from '../../../lib/science/light'
import { presetCosmology } from '../../../lib/science/cosmology'

const box = (fromA: number, toA: number) => ({
  wavelengthsA: [fromA, fromA + 1, toA - 1, toA],
  values: [0, 1, 1, 0],
})
/** f_nu ~ nu^alpha as L_lambda ~ lambda^(-2 - alpha). */
const powerLaw = (alpha: number) => {
  const wavelengthsA = Array.from({ length: 4000 }, (_, i) => 1000 * 1.0008 ** i)
  return { wavelengthsA, values: wavelengthsA.map((w) => (w / 5000) ** (-2 - alpha)) }
}
const r = box(5500, 6950)

// Seen to fail with energies in place of photons in one of the two bands.
describe('analytic limit or identity: K of a tabulated spectrum', () => {
  it.each([
    [-1, 0.5],
    [0, 1],
    [0.5, 2],
    [-2, 3],
  ])('a power law of index %s at z = %s, in one band', (alpha, z) => {
    expect(spectrumK(z, powerLaw(alpha), r, r)).toBeCloseTo(powerLawK(z, alpha), 3)
  })

  it('is -2.5 log10(1+z) where the rest band is the observed one blueshifted (Hogg et al. 2002, section 2)', () => {
    const wild = { wavelengthsA: [1000, 3000, 3100, 8000], values: [1, 4, 2, 9] }
    const z = 1.2
    const rest = { ...r, wavelengthsA: r.wavelengthsA.map((w) => w / (1 + z)) }
    expect(spectrumK(z, wild, rest, r)).toBeCloseTo(-2.5 * Math.log10(1 + z), 4)
  })

  it('nothing at z = 0 in one band', () => {
    expect(spectrumK(0, powerLaw(1.3), r, r)).toBeCloseTo(0, 9)
  })
})

describe('refusals of a spectrum', () => {
  const good = powerLaw(0)
  it.each([
    ['no overlap', { wavelengthsA: [100, 200], values: [1, 1] }, 'does not cover the band'],
    ['out of order', { wavelengthsA: [9000, 1000], values: [1, 1] }, 'must grow from row to row'],
    ['empty', { wavelengthsA: [], values: [] }, 'needs two rows at least'],
    ['negative', { wavelengthsA: [1000, 9000], values: [1, -1] }, 'must be 0 or more'],
    ['dark', { wavelengthsA: [1000, 9000], values: [0, 0] }, 'no light in one of the two bands'],
  ])('%s', (_, spectrum, sentence) => {
    expect(() => spectrumK(0.5, spectrum, r, r)).toThrow(sentence)
  })
  it('a redshift below 0', () => {
    expect(() => spectrumK(-0.1, good, r, r)).toThrow('a redshift of 0 or more')
  })
})

describe('lenses', () => {
  const planck = presetCosmology('planck-2018')

  it('published value: the usual 4 pi (sigma/c)^2 is 1.15" for 200 km/s and a source at infinity', () => {
    // 4 pi (200/299792.458)^2 rad = 1.1536", times D_LS/D_S.
    const share = planck.angularDiameterBetweenMpc(0.3, 2) / planck.angularDiameterMpc(2)
    expect(einsteinRadiusArcsec(planck, { z: 0.3, dispersionKmS: 200 }, 2)).toBeCloseTo(1.1536 * share, 3)
  })

  it('no lens behind its source, and none at rest', () => {
    expect(() => einsteinRadiusArcsec(planck, { z: 2, dispersionKmS: 200 }, 1)).toThrow('behind the lens')
    expect(() => einsteinRadiusArcsec(planck, { z: 0.3, dispersionKmS: 0 }, 1)).toThrow('velocity dispersion')
  })

  it('a magnification of 10 is 2.5 mag, with its error', () => {
    expect(magnifiedMag(10, 1)).toEqual({ magnitudes: 2.5, error: expect.closeTo(0.10857, 4) })
    expect(() => magnifiedMag(0)).toThrow('A magnification lies above 0')
    expect(() => magnifiedMag(2, -1)).toThrow('An error is 0 or more')
  })
})
