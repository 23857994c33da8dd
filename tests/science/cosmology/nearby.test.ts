import { describe, expect, it } from 'vitest'
import {
  cmbRedshift,
  heliocentricRedshift,
  NEARBY_REDSHIFT,
  nearbyDistance,
  presetCosmology,
  SOLAR_SPEED_KM_S,
  USUAL_PECULIAR_KM_S,
} from '../../../lib/science/cosmology'
import { fixture } from '../support/fixture'
import { relativeError } from '../support/relativeError'

interface Frame {
  raDeg: number
  decDeg: number
  zHeliocentric: number
  zCmb: number
}
interface Distance {
  cosmology: string
  raDeg: number
  decDeg: number
  zHeliocentric: number
  luminosityMpc: number
  errorOfMotionMpc: number
  errorOfBothMpc: number
}

const { source, frames, distances } = fixture<{ source: string; frames: Frame[]; distances: Distance[] }>(
  'nearby',
)
const planck = presetCosmology('planck-2018')
const towards = { raDeg: 187.706, decDeg: 12.391 }
const galaxy = { ...towards, redshift: 0.004, frame: 'heliocentric' as const }

describe(`independent code: ${source}, tests/reference/nearby.py`, () => {
  it('redshifts go from the Sun’s frame to that of the microwave background, and back', () => {
    expect(frames).toHaveLength(77)
    for (const row of frames) {
      // Astropy turns by way of FK5, whose axes are 23 mas off those of ICRS: 1.4e-10 (1+z). The dipole itself is
      // known to some 4e-7.
      expect(Math.abs(cmbRedshift(row.zHeliocentric, row) - row.zCmb)).toBeLessThan(4e-10)
      expect(Math.abs(heliocentricRedshift(row.zCmb, row) - row.zHeliocentric)).toBeLessThan(4e-10)
    }
  })

  it('distances near by, and their errors', () => {
    expect(distances).toHaveLength(40)
    for (const row of distances) {
      const asked = { ...row, redshift: row.zHeliocentric, frame: 'heliocentric' as const }
      const c = presetCosmology(row.cosmology)
      const found = nearbyDistance(c, asked)
      expect(relativeError(found.luminosityMpc, row.luminosityMpc)).toBeLessThan(1e-7)
      // The reference takes differences over 20 km/s and 2e-5 in redshift.
      expect(relativeError(found.luminosityErrorMpc, row.errorOfMotionMpc)).toBeLessThan(1e-4)
      const both = nearbyDistance(c, { ...asked, redshiftError: 1e-3 })
      expect(relativeError(both.luminosityErrorMpc, row.errorOfBothMpc)).toBeLessThan(1e-4)
      const inCmb = nearbyDistance(c, { ...asked, redshift: found.zCmb, frame: 'cmb' })
      expect(relativeError(inCmb.luminosityMpc, found.luminosityMpc)).toBeLessThan(1e-12)
    }
  })
})

describe('published value', () => {
  it('the Sun heads for RA 167.942, Dec −6.944', () => {
    // Planck Collaboration 2020, A&A 641, A1, table 3: ± 0.007 degrees, hence the farthest blueshift within 1e-8.
    const most = cmbRedshift(0, { raDeg: 167.942, decDeg: -6.944 })
    const beta = SOLAR_SPEED_KM_S / 299_792.458
    expect(Math.abs(most - (Math.sqrt((1 + beta) / (1 - beta)) - 1))).toBeLessThan(1e-8)
    expect(cmbRedshift(0, { raDeg: 347.942, decDeg: 6.944 })).toBeLessThan(0)
  })

  it('300 km/s of its own leave 10 % of a distance open at z = 0.01', () => {
    // 300 km/s / (0.01 c) = 10.0 %; the distance is not quite linear in z there, hence 1 %.
    expect(USUAL_PECULIAR_KM_S).toBe(300)
    const { errorShare } = nearbyDistance(planck, { ...towards, redshift: 0.01, frame: 'cmb' })
    expect(Math.abs(errorShare / 0.1 - 1)).toBeLessThan(0.02)
  })
})

describe('when a redshift is no distance', () => {
  it('below z = 0.01 a measured distance is asked for', () => {
    const near = nearbyDistance(planck, galaxy)
    expect(near.trusted).toBe(false)
    expect(near.advice).toBe(
      'At z = 0.0051 against the microwave background, 300\u00a0km/s of a galaxy’s own motion leave its distance open by 20\u00a0%. Give a measured distance with its method, such as Cepheids, the tip of the red giant branch or surface brightness fluctuations.',
    )
    const far = nearbyDistance(planck, { ...galaxy, redshift: NEARBY_REDSHIFT, frame: 'cmb' })
    expect([far.trusted, far.advice]).toEqual([true, null])
  })

  it('a negative redshift, or one that is motion alone, is refused in words', () => {
    expect(() => nearbyDistance(planck, { ...galaxy, redshift: -0.001 })).toThrow(
      'A negative redshift places lines, but gives no distance.',
    )
    expect(() => nearbyDistance(planck, { ...galaxy, raDeg: 347.9, decDeg: 6.9, redshift: 0.001 })).toThrow(
      'Against the microwave background this redshift is −0.00023: motion, not expansion.',
    )
    expect(cmbRedshift(-0.001, towards)).toBeGreaterThan(-0.001)
  })

  it.each([
    [{ redshift: NaN }, 'A redshift must be a number.'],
    [{ redshift: -1 }, 'A redshift lies above −1.'],
    [{ raDeg: 361 }, 'A right ascension lies between 0 and 360 degrees.'],
    [{ decDeg: NaN }, 'A declination lies between −90 and 90 degrees.'],
    [{ redshiftError: -1 }, 'The error of a redshift lies between 0 and 1.'],
    [{ peculiarKmS: Infinity }, 'A peculiar velocity lies between 0 and 10 000 km/s.'],
  ])('%o', (change, sentence) => {
    expect(() => nearbyDistance(planck, { ...galaxy, ...change })).toThrow(sentence)
  })
})
