import { describe, expect, it } from 'vitest'
import { expansionHistory, presetCosmology, type Moment } from '../../../lib/science/cosmology'
import { relativeError } from '../support/relativeError'
import { universe } from '../support/models'

const rises = (history: readonly Moment[]) =>
  history.every((m, i) => i === 0 || m.gyrFromNow > (history[i - 1]?.gyrFromNow ?? Infinity))

describe('analytic limit: size against time', () => {
  it('Einstein-de Sitter: a = (t/t0)^2/3, past and future', () => {
    const c = presetCosmology('einstein-de-sitter')
    const history = expansionHistory(c, 1e-3, 50, 60)
    expect(rises(history)).toBe(true)
    const now = (2 / 3) * c.hubbleTimeGyr
    for (const { gyrFromNow, scaleFactor } of history) {
      // Times count from now: what is left of a small age has lost those digits.
      expect(
        Math.abs(gyrFromNow + now - now * scaleFactor ** 1.5) / (now * (1 + scaleFactor ** 1.5)),
      ).toBeLessThan(1e-12)
    }
  })

  it('a bounce of Lambda: a = a_b cosh, shrinking first', () => {
    const c = universe({ Om0: 0, Ode0: 1.5 })
    const history = expansionHistory(c, 0.1, 4, 40)
    expect(history).toHaveLength(79)
    expect(rises(history)).toBe(true)
    const aB = Math.sqrt(1 / 3)
    const turned = -(c.universe.turnaroundGyr ?? 0)
    for (const { gyrFromNow, scaleFactor } of history) {
      const expected = aB * Math.cosh((Math.sqrt(1.5) / c.hubbleTimeGyr) * (gyrFromNow - turned))
      expect(relativeError(scaleFactor, expected)).toBeLessThan(1e-9)
    }
  })

  it('flat with a negative Lambda: a^3 = 3 sin^2, there and back', () => {
    const c = universe({ Om0: 1.5, Ode0: -0.5 })
    const history = expansionHistory(c, 0.01, 9, 40)
    expect(history).toHaveLength(79)
    expect(rises(history)).toBe(true)
    const age = c.ageGyr(0)
    for (const { gyrFromNow, scaleFactor } of history) {
      const sine = Math.sin((1.5 * Math.sqrt(0.5) * (age + gyrFromNow)) / c.hubbleTimeGyr)
      expect(Math.abs(scaleFactor ** 3 - 3 * sine * sine)).toBeLessThan(1e-10)
    }
  })

  it('a big rip: a = (1 - t/t_rip)^-4/3 for w = -1.5 alone', () => {
    const c = universe({ Om0: 0, Ode0: 'flat', w0: -1.5 })
    const rip = c.universe.ripInGyr ?? 0
    const history = expansionHistory(c, 0.5, 1e4, 40)
    expect(history.at(-1)?.gyrFromNow).toBeLessThan(rip)
    for (const { gyrFromNow, scaleFactor } of history) {
      expect(relativeError((1 - gyrFromNow / rip) ** (-4 / 3), scaleFactor)).toBeLessThan(1e-9)
    }
  })
})

describe('histories of odd universes', () => {
  it('one that lingers: most of its time is spent at one size', () => {
    const c = universe({ Ode0: 1.7 })
    const lingers = c.universe.loiteringRedshift ?? 0
    const history = expansionHistory(c, 0.01, 2, 400)
    const near = history.filter((m) => Math.abs(m.scaleFactor * (1 + lingers) - 1) < 0.1)
    const span = (near.at(-1)?.gyrFromNow ?? 0) - (near[0]?.gyrFromNow ?? 0)
    expect(span / c.ageGyr(0)).toBeGreaterThan(0.2)
  })

  it('one that bounced and will fall back is shown shrinking, growing and shrinking', () => {
    // Curvature closes the past, dark energy that thins out faster than curvature the future.
    const c = universe({ Om0: 0, Ode0: 1.5, w0: -1, wa: -2 })
    expect([c.universe.origin, c.universe.fate]).toEqual(['bounce', 'recollapses'])
    const history = expansionHistory(c, 0.01, 1e6, 50)
    expect(history).toHaveLength(148)
    expect(rises(history)).toBe(true)
    expect(Math.max(...history.map((m) => m.scaleFactor))).toBeCloseTo(1 / (1 + c.furthestRedshift), 9)
  })

  it.each([
    [0, 1, 10],
    [1, 1, 10],
    [0.1, Infinity, 10],
    [NaN, 1, 10],
    [0.1, 1, 1],
    [0.1, 1, 2.5],
  ])('refuses sizes %d to %d in %d points', (from, to, points) => {
    expect(() => expansionHistory(presetCosmology('planck-2018'), from, to, points)).toThrow(
      'must rise from above 0',
    )
  })

  it('refuses sizes the universe never has', () => {
    expect(() => expansionHistory(universe({ Ode0: 1.75 }), 0.01, 0.1, 10)).toThrow(
      'never has any of these sizes',
    )
  })
})
