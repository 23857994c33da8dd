import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { igmInBand, igmTransmission, LYMAN_LIMIT_A } from '../../../lib/science/light'
import { relativeError } from '../support/relativeError'

const lyman = (level: number) => (LYMAN_LIMIT_A * level ** 2) / (level ** 2 - 1)
/** Just blue of Lyman alpha, where no higher line absorbs. */
const forestDepth = (z: number) => -Math.log(igmTransmission(z, lyman(2) * (1 + z) * 0.999))

// Seen to fail with the lines left out past Lyman beta, and with the continuum applied redward of the limit.
describe('published value', () => {
  it.each([3, 3.5, 4])(
    'the mean depth of the forest at z = %s agrees with Becker et al. 2013 (MNRAS 430, 2067, eq. 5)',
    (z) => {
      // An independent measurement: both state errors of some percent, and damped systems are left out there.
      const measured = 0.751 * ((1 + z) / 4.5) ** 2.9 - 0.132
      expect(relativeError(forestDepth(z), measured)).toBeLessThan(0.12)
    },
  )

  it('the mean free path at the limit is near 85 Mpc at z = 3 (Prochaska, Worseck & O’Meara 2009: 50 ± 5 h/72 proper)', () => {
    // The depth of the continuum a little blueward of the limit: 1 after some 50 proper Mpc, 3 % in wavelength there.
    const depth = (share: number) =>
      Math.log(igmTransmission(3.7, LYMAN_LIMIT_A * 4.7)) -
      Math.log(igmTransmission(3.7, LYMAN_LIMIT_A * 4.7 * share))
    expect(depth(0.95)).toBeGreaterThan(0.3)
    expect(depth(0.95)).toBeLessThan(2.5)
  })
})

describe('analytic limit or identity', () => {
  it('nothing is lost redward of Lyman alpha, nor at z = 0', () => {
    for (const z of [0.5, 3, 6]) expect(igmTransmission(z, lyman(2) * (1 + z) * 1.0001)).toBe(1)
    expect(igmTransmission(0, 1000)).toBe(1)
  })

  it('the continuum sets in without a jump at the limit of the source', () => {
    for (const z of [0.8, 1.5, 3, 5.5]) {
      const edge = LYMAN_LIMIT_A * (1 + z)
      const [red, blue] = [igmTransmission(z, edge * 1.00001), igmTransmission(z, edge * 0.99999)]
      expect(Math.abs(Math.log(red / blue))).toBeLessThan(0.03)
    }
  })

  it('the pieces meet where they change', () => {
    for (const [z, x] of [
      [3, 2.2],
      [5.5, 2.2],
      [5.5, 5.7],
      [3, 3],
    ] as const) {
      const [low, high] = [0.9999, 1.0001].map((by) => igmTransmission(z, LYMAN_LIMIT_A * x * by))
      expect(Math.abs((low ?? 0) - (high ?? 1))).toBeLessThan(0.01)
    }
  })

  it('lies between 0 and 1, and a further source loses more', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 7, noNaN: true }),
        fc.double({ min: 1000, max: 12_000, noNaN: true }),
        (z, wavelengthA) => {
          const here = igmTransmission(z, wavelengthA)
          return here >= 0 && here <= 1 && igmTransmission(z + 0.3, wavelengthA) <= here + 0.02
        },
      ),
      { numRuns: 400 },
    )
  })

  it('a u band loses more than half of a source at z = 3, nearly all of one at z = 4, and an i band nothing', () => {
    expect(igmInBand(3, 3200, 3900)).toBeLessThan(0.5)
    expect(igmInBand(4, 3200, 3900)).toBeLessThan(0.1)
    expect(igmInBand(3, 4100, 5450)).toBeGreaterThan(0.6)
    expect(igmInBand(3, 6900, 8200)).toBe(1)
  })
})
