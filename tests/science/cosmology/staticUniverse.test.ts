import { describe, expect, it } from 'vitest'
import { disturbStatic, staticUniverse } from '../../../lib/science/cosmology'
import { relativeError } from '../support/relativeError'
import { universe } from '../support/models'

/** Some atoms of hydrogen in a cubic metre. */
const still = staticUniverse(3e-27)

describe('the static universe', () => {
  it('both Friedmann equations are zero', () => {
    const scale = 4 * Math.PI * 6.6743e-11 * 3e-27
    expect(Math.abs(still.expansionPerS2) / scale).toBeLessThan(1e-14)
    expect(Math.abs(still.accelerationPerS2) / scale).toBeLessThan(1e-14)
    expect(relativeError(still.lambdaPerM2 * still.radiusM ** 2, 1)).toBeLessThan(1e-14)
  })

  it('a density of 1e-26 kg/m³ belongs to a radius of 1.035e26 m', () => {
    // R = c/sqrt(4 pi G rho) (Einstein 1917), worked out by hand.
    expect(staticUniverse(1e-26).radiusM / 1e26).toBeCloseTo(1.0352, 3)
  })

  it.each([1e-6, -1e-6])('disturbed by %d it leaves as (1 - cosh sqrt(Lambda) c t)/3', (contrast) => {
    const time = 6 / still.growthPerGyr
    const moments = disturbStatic(still, contrast, time, 25)
    expect(moments).toHaveLength(25)
    for (const { gyrFromNow, scaleFactor } of moments.slice(1)) {
      const linear = (contrast / 3) * (1 - Math.cosh(still.growthPerGyr * gyrFromNow))
      // The second order of a change that reaches 7e-5.
      expect(relativeError(scaleFactor - 1, linear)).toBeLessThan(2e-4)
    }
  })

  it('keeps its energy: (da/dt)^2 = omega^2/3 (a^2 + 2 (1 + d)/a - 3 - 2 d) far from rest', () => {
    const moments = disturbStatic(still, -0.01, 9 / still.growthPerGyr, 9001)
    const step = moments[1]?.gyrFromNow ?? 0
    for (const i of [3000, 6000, 8000]) {
      const [a, b, c] = [moments[i - 1], moments[i], moments[i + 1]].map((m) => m?.scaleFactor ?? NaN)
      const speed = ((c ?? NaN) - (a ?? NaN)) / (2 * step) / still.growthPerGyr
      const size = b ?? NaN
      const expected = (size * size + (2 * 0.99) / size - 3 + 0.02) / 3
      // Differences over a thousandth of the growth time.
      expect(relativeError(speed * speed, expected)).toBeLessThan(1e-6)
    }
  })

  it('too dense it falls together and the run ends; too thin it runs away', () => {
    const falls = disturbStatic(still, 0.1, 20 / still.growthPerGyr, 200)
    expect(falls.length).toBeLessThan(200)
    expect(falls.at(-1)?.scaleFactor).toBeLessThan(0.5)
    const flies = disturbStatic(still, -0.1, 20 / still.growthPerGyr, 200)
    expect(flies.at(-1)?.scaleFactor).toBeGreaterThan(100)
  })

  it('a model that left the static state grew away from it at the rate sqrt(Lambda) c', () => {
    // Om = 0.3 and the Lambda of Carroll, Press & Turner 1992, eq. 14, at equality: E^2 has a double zero.
    const Om0 = 0.3
    const Ode0 = 4 * Om0 * Math.cosh(Math.acosh((1 - Om0) / Om0) / 3) ** 3
    const c = universe({ Om0, Ode0 })
    expect(c.universe.origin).toBe('no-beginning')
    expect(c.universe.sentence).toContain('left a static state')
    const rate = Math.sqrt(3 * Ode0) / c.hubbleTimeGyr
    // The static radius: matter is twice Lambda, (1+z)^3 = 2 Ode0/Om0.
    const xs = Math.log((2 * Ode0) / Om0) / 3
    const growth = (d: number): number => {
      const time = (x: number): number => c.lookbackGyr(Math.expm1(xs - x))
      return Math.log(1.01) / (time(d) - time(1.01 * d))
    }
    // Corrections go with the distance: two distances extrapolated to none.
    const found = 2 * growth(0.002) - growth(0.004)
    expect(relativeError(found, rate)).toBeLessThan(1e-4)
  })

  it.each([
    [() => staticUniverse(0), 'must be above 0'],
    [() => staticUniverse(NaN), 'must be above 0'],
    [() => disturbStatic(still, 1, 1, 2), 'between −1 and 1'],
    [() => disturbStatic(still, 0.1, Infinity, 2), 'Give a time'],
    [() => disturbStatic(still, 0.1, 1, 1), 'Give a time'],
    [() => disturbStatic(still, 0.1, 1e9, 100_000), 'too many growth times'],
  ])('refusal %#', (run, sentence) => {
    expect(run).toThrow(sentence)
  })
})
