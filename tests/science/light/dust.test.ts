import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { extinctionMag, SFD_RECALIBRATION, type DustLaw } from '../../../lib/science/light'
import { relativeError } from '../support/relativeError'

const of = (law: DustLaw, wavelengthA: number, change: object = {}): number =>
  extinctionMag({ ebv: 1, isSfd: false, law, ...change }, wavelengthA)

// Seen to fail with the spline clamped at zero slope, and with the recalibration applied twice.
describe('published value', () => {
  it.each([
    ['U', 2.78, 1.569],
    ['B', 2.27, 1.337],
    ['V', 1.82, 1],
    ['R', 1.43, 0.751],
    ['I', 1.11, 0.479],
    ['J', 0.8, 0.282],
    ['H', 0.63, 0.19],
    ['K', 0.46, 0.114],
  ] as const)(
    'A(%s)/A(V) of Cardelli, Clayton & Mathis 1989, table 3',
    (_, inverseMicrometres, published) => {
      // The table holds the measured curve, which the formula fits to a percent or two.
      expect(relativeError(of('CCM89', 1e4 / inverseMicrometres) / 3.1, published)).toBeLessThan(0.016)
    },
  )

  // The table weighs a star's spectrum through each filter; one wavelength stands for it here: 4 %.
  it.each([
    ['SDSS g', 4670, 3.303],
    ['SDSS r', 6156, 2.285],
    ['SDSS i', 7472, 1.698],
    ['SDSS z', 8917, 1.263],
    ['Landolt B', 4330, 3.626],
    ['Landolt V', 5404, 2.742],
    ['UKIRT J', 12_483, 0.709],
    ['UKIRT H', 16_313, 0.449],
    ['UKIRT K', 22_010, 0.302],
  ] as const)('A(%s)/E(B-V) of SFD by Schlafly & Finkbeiner 2011, table 6', (_, wavelengthA, published) => {
    expect(relativeError(of('F99', wavelengthA, { isSfd: true }), published)).toBeLessThan(0.04)
  })

  it('the anchors of Fitzpatrick 1999, table 3, for R = 3.1', () => {
    expect(of('F99', 6000)).toBeCloseTo(-0.426 + 1.0044 * 3.1, 9)
    expect(of('F99', 4110)).toBeCloseTo(1.208 + 1.0032 * 3.1 - 0.00033 * 3.1 ** 2, 9)
    expect(of('F99', 12_200)).toBeCloseTo(0.829, 9)
  })
})

describe('analytic limit or identity', () => {
  it('grows with the reddening and with R, and is recalibrated only when read from that map', () => {
    expect(of('F99', 5000, { ebv: 0.2 })).toBeCloseTo(0.2 * of('F99', 5000), 12)
    expect(of('F99', 5000, { rv: 5 })).toBeGreaterThan(of('F99', 5000))
    expect(of('CCM89', 5000, { isSfd: true })).toBeCloseTo(SFD_RECALIBRATION * of('CCM89', 5000), 12)
    expect(of('F99', 5000, { ebv: 0 })).toBe(0)
  })

  it('both laws redden: bluer light loses more, from 2.3 micrometres to 3,300 A', () => {
    fc.assert(
      fc.property(
        fc.constantFrom<DustLaw>('F99', 'CCM89'),
        fc.double({ min: 3300, max: 23_000, noNaN: true }),
        (law, w) => of(law, w) > of(law, w * 1.05),
      ),
      { numRuns: 300 },
    )
  })

  it('are continuous where their pieces meet', () => {
    for (const [law, edge] of [
      ['CCM89', 1e4 / 1.1],
      ['CCM89', 1e4 / 3.3],
      ['F99', 2700],
    ] as const)
      expect(relativeError(of(law, edge * 1.0001), of(law, edge * 0.9999))).toBeLessThan(0.01)
  })
})

describe('refusals', () => {
  it.each([
    [{ ebv: -0.1 }, 5000, 'A reddening E(B−V) lies between 0 and 10'],
    [{ ebv: NaN }, 5000, 'A reddening E(B−V) lies between 0 and 10'],
    [{ rv: 1 }, 5000, 'R_V lies between 2 and 6.'],
    [{}, 900, 'The law of reddening reaches from'],
    [{}, NaN, 'The law of reddening reaches from'],
  ])('%o at %s', (change, wavelengthA, sentence) => {
    expect(() => of('F99', wavelengthA, change)).toThrow(sentence)
  })
})
