import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  cosmicVariance,
  expectedCount,
  stellarMasses,
  type StellarMass,
} from '../../../lib/science/cosmology'

const fields = { GOODS: 160 / 3600, GEMS: 784 / 3600, COSMOS: 7056 / 3600 } as const
const of = (areaDeg2: number, stellarMass: StellarMass, meanZ = 2, depth = 0.5) =>
  cosmicVariance({ areaDeg2, stellarMass, zMin: meanZ - depth / 2, zMax: meanZ + depth / 2 })

// Seen to fail with the depth scaled as its root, and with the bias of the next mass.
describe('published value', () => {
  // The abstract of Moster et al. 2011 (arXiv:1001.1737), z = 2 and a depth of 0.5, in whole percent.
  it.each<[keyof typeof fields, StellarMass, number]>([
    ['GOODS', 'above-11.0', 38],
    ['GEMS', 'above-11.0', 27],
    ['COSMOS', 'above-11.0', 12],
    ['GOODS', '10.0-10.5', 19],
    ['GEMS', '10.0-10.5', 13],
    ['COSMOS', '10.0-10.5', 6],
  ])('%s, log m %s: %s %%', (field, mass, percent) => {
    expect(Math.round(100 * of(fields[field], mass))).toBe(percent)
  })
})

describe('analytic limit or identity', () => {
  it('is a power of the area between two fields', () => {
    const middle = Math.sqrt(fields.GOODS * fields.GEMS)
    const between = Math.sqrt(of(fields.GOODS, '9.5-10.0') * of(fields.GEMS, '9.5-10.0'))
    expect(of(middle, '9.5-10.0')).toBeCloseTo(between, 12)
  })

  it('goes as one over the root of the depth', () => {
    expect(of(0.5, '9.5-10.0', 2, 0.2) / of(0.5, '9.5-10.0', 2, 0.8)).toBeCloseTo(2, 12)
  })

  it('falls with the area, without a step at a field', () => {
    fc.assert(
      fc.property(
        fc.double({ min: Math.log(10.9 / 3600), max: Math.log(1.9), noNaN: true }),
        fc.double({ min: 0.4, max: 3.2, noNaN: true }),
        fc.constantFrom(...stellarMasses),
        (logArea, z, mass) => {
          const [small, large] = [of(Math.exp(logArea), mass, z), of(1.01 * Math.exp(logArea), mass, z)]
          return large < small && large > 0.98 * small
        },
      ),
      { numRuns: 300 },
    )
  })

  it('grows with the mass', () => {
    const shares = stellarMasses.slice(0, 6).map((mass) => of(0.5, mass))
    expect(shares).toEqual(shares.toSorted((a, b) => a - b))
  })

  it('a count has both deviations in quadrature', () => {
    const found = expectedCount(1e6, 4e-4, 0.1)
    expect([found.count, found.poisson, found.cosmic]).toEqual([400, 20, 40])
    expect(found.together).toBeCloseTo(Math.sqrt(2000), 12)
    expect(expectedCount(1e6, 0)).toEqual({ count: 0, poisson: 0, cosmic: 0, together: 0 })
  })
})

describe('refusals', () => {
  it.each([
    [{ areaDeg2: 10 / 3600 }, 'areas from 11 square arcminutes to 1.96 square degrees'],
    [{ areaDeg2: 2 }, 'areas from 11 square arcminutes to 1.96 square degrees'],
    [{ areaDeg2: NaN }, 'areas from 11 square arcminutes to 1.96 square degrees'],
    [{ zMin: 1.95 }, 'shells of 0.1 in redshift or more'],
    [{ zMin: 3 }, 'shells of 0.1 in redshift or more'],
    [{ zMin: -1 }, 'shells of 0.1 in redshift or more'],
    [{ zMax: 6 }, 'mean redshifts from 0.1 to 3.5'],
    [{ zMin: 0, zMax: 0.15 }, 'mean redshifts from 0.1 to 3.5'],
  ])('%o', (over, sentence) => {
    const asked = { areaDeg2: 0.5, zMin: 1.5, zMax: 2, stellarMass: '9.5-10.0', ...over } as const
    expect(() => cosmicVariance(asked)).toThrow(sentence)
  })

  it.each([
    [-1, 1, 0, 'A volume is 0 or more.'],
    [1, -1, 0, 'A number density lies between'],
    [1, NaN, 0, 'A number density lies between'],
    [1, 1, -0.1, 'A variance is 0 or more.'],
  ])('%s Mpc³ of %s with %s', (volume, density, variance, sentence) => {
    expect(() => expectedCount(volume, density, variance)).toThrow(sentence)
  })
})
