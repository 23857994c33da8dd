import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { inCircle, inRectangle } from '../../../lib/science/exposure/image/mixture'
import { moffatMixture } from '../../../lib/science/exposure/image/moffatMixture'
import { sersicMixture } from '../../../lib/science/exposure/image/sersicMixture'
import { sourceImage } from '../../../lib/science/exposure/image/sourceImage'
import { convolved, fullWidth, halfLightRadius } from '../../../lib/science/exposure/image/widths'
import { erf } from '../../../lib/science/numeric/erf'
import { fixture } from '../support/fixture'

interface Fixture {
  source: string
  apertures: {
    fwhm: number
    beta: number
    halfWidth: number
    halfHeight: number
    rectangle: number
    circle: number
  }[]
  sersic: { n: number; radius: number; circle: number }[]
  spread: {
    n: number
    effectiveArcsec: number
    fwhm: number
    beta: number
    circles: { radius: number; share: number }[]
    slits: { halfWidth: number; halfHeight: number; share: number }[]
  }[]
}

const { source, apertures, sersic, spread } = fixture<Fixture>('exposure')

// Seen to fail with beta - 2 for beta - 1 in the weights, and with the variances of a convolution multiplied.
describe(`independent code: ${source}`, () => {
  it('has eighteen apertures, fifty Sérsic circles and eight galaxies under seeing', () => {
    expect([apertures.length, sersic.length, spread.length]).toEqual([18, 50, 8])
  })

  it.each(apertures)('Moffat, FWHM $fwhm, beta $beta, $halfWidth by $halfHeight', (row) => {
    // Steps of 0.5 in ln t leave a few parts in a million, a thousandth of what seeing is known to.
    const image = moffatMixture(row.fwhm, row.beta)
    expect(Math.abs(inRectangle(image, row.halfWidth, row.halfHeight) - row.rectangle)).toBeLessThan(1e-5)
    expect(Math.abs(inCircle(image, row.halfWidth) - row.circle)).toBeLessThan(1e-5)
  })

  it.each(sersic)('Sérsic, n = $n, inside $radius half-light radii', ({ n, radius, circle }) => {
    expect(Math.abs(inCircle(sersicMixture(1, n), radius) - circle)).toBeLessThan(5e-5)
  })

  it.each(spread)('Sérsic n = $n, $effectiveArcsec″, under seeing of $fwhm″', (row) => {
    const image = convolved(sersicMixture(row.effectiveArcsec, row.n), moffatMixture(row.fwhm, row.beta))
    // The grid of the reference, 0.08″ wide and cut at 24″, is good to a few thousandths itself.
    for (const { radius, share } of row.circles)
      expect(Math.abs(inCircle(image, radius) - share)).toBeLessThan(4e-3)
    for (const { halfWidth, halfHeight, share } of row.slits)
      expect(Math.abs(inRectangle(image, halfWidth, halfHeight) - share)).toBeLessThan(4e-3)
  })
})

describe('published value', () => {
  it('the error function (Abramowitz & Stegun 1964, table 7.1)', () => {
    for (const [x, value] of [
      [0.1, 0.112462916],
      [0.5, 0.5204998778],
      [1, 0.8427007929],
      [2, 0.995322265],
    ] as const)
      expect(erf(x)).toBeCloseTo(value, 10)
    expect(erf(-1)).toBe(-erf(1))
    expect(erf(7)).toBe(1)
  })

  it('half the light of an exponential lies within 1.678 scale lengths (Graham & Driver 2005, section 2.1)', () => {
    // So within 1 scale length lies 1 - 2/e of it.
    expect(inCircle(sersicMixture(1.678347, 1), 1)).toBeCloseTo(1 - 2 / Math.E, 4)
  })
})

describe('analytic limit or identity', () => {
  it('the width and the half-light radius are those asked for', () => {
    for (const beta of [2.5, 3, 4]) expect(fullWidth(moffatMixture(0.8, beta))).toBeCloseTo(0.8, 3)
    for (const n of [0.5, 1, 4, 8]) expect(halfLightRadius(sersicMixture(1.3, n))).toBeCloseTo(1.3, 6)
  })

  it('all the light is there', () => {
    expect(inCircle(moffatMixture(1), 1e4)).toBeCloseTo(1, 12)
    expect(inRectangle(sersicMixture(1, 4), 1e6, 1e6)).toBeCloseTo(1, 12)
  })

  it('an image off the slit loses light, the more the further', () => {
    const image = moffatMixture(0.8)
    const shares = [0, 0.3, 0.6, 1.2].map((off) => inRectangle(image, 0.5, 1, off))
    expect(shares).toEqual([...shares].sort((a, b) => b - a))
    expect(inRectangle(image, 0.5, 1, -0.3)).toBeCloseTo(inRectangle(image, 0.5, 1, 0.3), 12)
  })

  it('light only ever grows with the aperture, and spreading takes none away', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.3, max: 3, noNaN: true }),
        fc.double({ min: 0.1, max: 5, noNaN: true }),
        fc.double({ min: 0.5, max: 8, noNaN: true }),
        (fwhm, effectiveRadiusArcsec, sersicIndex) => {
          const { light, imageArcsec } = sourceImage(fwhm, {
            kind: 'extended',
            effectiveRadiusArcsec,
            sersicIndex,
          })
          if (!light) return false
          const shares = [0.1, 0.5, 1, 3, 10, 1e4].map((radius) => inCircle(light, radius))
          const grows = shares.every((share, i) => share > (shares[i - 1] ?? 0))
          return grows && Math.abs((shares.at(-1) ?? 0) - 1) < 1e-3 && imageArcsec >= fwhm
        },
      ),
      { numRuns: 60 },
    )
  })
})

describe('refusals', () => {
  it.each([0.4, 9, NaN])('a Sérsic index of %s', (n) => {
    expect(() => sersicMixture(1, n)).toThrow('A Sérsic index lies between 0.5 and 8.')
  })
  it.each([0, -1, Infinity])('a half-light radius of %s', (radius) => {
    expect(() => sersicMixture(radius, 1)).toThrow('A half-light radius lies above 0')
  })
})
