import { describe, expect, it } from 'vitest'
import { createCosmology } from '../../../lib/science/cosmology'
import { relativeError } from '../support/relativeError'
import { universe } from '../support/models'

const redshifts = [1e-6, 1e-4, 0.01, 0.1, 0.5, 1, 2, 5, 10, 20, 100, 1100]
/** Rounding of a dozen operations in double precision. */
const EXACT = 1e-12

describe('analytic limit or identity', () => {
  it('Einstein-de Sitter: D_C = 2 D_H (1 - (1+z)^-1/2), t = 2/3 t_H (1+z)^-3/2', () => {
    const c = universe({ Om0: 1, Ode0: 0 })
    for (const z of redshifts) {
      const distance = -2 * c.hubbleDistanceMpc * Math.expm1(-0.5 * Math.log1p(z))
      expect(relativeError(c.comovingMpc(z), distance)).toBeLessThan(EXACT)
      expect(relativeError(c.ageGyr(z), (2 / 3) * c.hubbleTimeGyr * (1 + z) ** -1.5)).toBeLessThan(EXACT)
      expect(relativeError(c.comovingVolumeMpc3(z), (4 / 3) * Math.PI * distance ** 3)).toBeLessThan(EXACT)
      expect(c.q(z)).toBeCloseTo(0.5, 12)
    }
  })

  it('de Sitter: D_C = D_H z, lookback = t_H ln(1+z), no beginning', () => {
    const c = universe({ Om0: 0, Ode0: 'flat' })
    for (const z of redshifts) {
      expect(relativeError(c.comovingMpc(z), c.hubbleDistanceMpc * z)).toBeLessThan(EXACT)
      expect(relativeError(c.lookbackGyr(z), c.hubbleTimeGyr * Math.log1p(z))).toBeLessThan(EXACT)
    }
    expect(c.universe.origin).toBe('no-beginning')
    expect(() => c.ageGyr(0)).toThrow('has no big bang to count an age from')
  })

  it('Milne: D_M = D_H sinh ln(1+z), t = t_H/(1+z), volume in closed form', () => {
    const c = universe({ Om0: 0, Ode0: 0 })
    for (const z of redshifts) {
      const chi = Math.log1p(z)
      expect(relativeError(c.transverseComovingMpc(z), c.hubbleDistanceMpc * Math.sinh(chi))).toBeLessThan(
        EXACT,
      )
      expect(relativeError(c.ageGyr(z), c.hubbleTimeGyr / (1 + z))).toBeLessThan(EXACT)
      // pi (sinh 2 chi - 2 chi), which cancels at small chi: there the first terms of its series.
      const y = 2 * chi
      const ball = z > 0.05 ? Math.sinh(y) - y : (y ** 3 / 6) * (1 + (y * y) / 20 + y ** 4 / 840)
      const volume = Math.PI * c.hubbleDistanceMpc ** 3 * ball
      expect(relativeError(c.comovingVolumeMpc3(z), volume)).toBeLessThan(EXACT)
    }
  })

  it.each([0.1, 0.3, 0.999, 1.001, 1.5, 3])('Mattig 1958, Lambda = 0, Om = %d', (Om0) => {
    // Astron. Nachr. 284, 109, as Terrell 1977, Am. J. Phys. 45, 869, writes it without cancellation:
    // D_L = c/H0 z (1 + z (1-q0) / (1 + q0 z + sqrt(1 + 2 q0 z))), q0 = Om/2.
    const c = universe({ Om0, Ode0: 0 })
    const q0 = Om0 / 2
    for (const z of redshifts) {
      const expected =
        c.hubbleDistanceMpc * z * (1 + (z * (1 - q0)) / (1 + q0 * z + Math.sqrt(1 + 2 * q0 * z)))
      expect(relativeError(c.luminosityMpc(z), expected)).toBeLessThan(EXACT)
    }
  })

  it('matter alone, open: the age by its development angle', () => {
    // Peebles 1993, eq. 13.10: t = t_H Om/2 (1-Om)^-3/2 (sinh n - n), sinh^2(n/2) = (1-Om)/Om / (1+z).
    const c = universe({ Om0: 0.3, Ode0: 0 })
    for (const z of redshifts) {
      const n = 2 * Math.asinh(Math.sqrt(0.7 / 0.3 / (1 + z)))
      const expected = ((c.hubbleTimeGyr * 0.3) / 2 / 0.7 ** 1.5) * (Math.sinh(n) - n)
      expect(relativeError(c.ageGyr(z), expected)).toBeLessThan(EXACT)
    }
  })

  it('matter and Lambda, flat: the age has a closed form', () => {
    // t = 2/(3 sqrt(OL)) t_H asinh(sqrt(OL/Om) (1+z)^-3/2).
    const c = universe({ Om0: 0.3, Ode0: 'flat' })
    for (const z of redshifts) {
      const expected =
        ((2 * c.hubbleTimeGyr) / (3 * Math.sqrt(0.7))) * Math.asinh(Math.sqrt(0.7 / 0.3) * (1 + z) ** -1.5)
      expect(relativeError(c.ageGyr(z), expected)).toBeLessThan(EXACT)
    }
  })

  it('matter and radiation, flat: D_C has a closed form', () => {
    // With Or = 1 - Om: D_C = 2 D_H/Om (sqrt(Om + Or) - sqrt(Om a + Or)); the photons of 20 K are a large Or.
    const c = universe({ Om0: 0.9, Ode0: 0, Tcmb0: 20, H0: 70 })
    const flat = createCosmology({ ...c.parameters, Om0: 1 - c.Or0, Ode0: 0 })
    const Om = 1 - c.Or0
    for (const z of redshifts) {
      // 1 - sqrt(y) as (1 - y)/(1 + sqrt y), with 1 - y = Om z/(1+z).
      const expected = (2 * flat.hubbleDistanceMpc * z) / (1 + z) / (1 + Math.sqrt(Om / (1 + z) + c.Or0))
      expect(relativeError(flat.comovingMpc(z), expected)).toBeLessThan(EXACT)
    }
  })

  it('closed space of dust: cycloid lifetime and volume of the whole', () => {
    // Om = 2: from bang to crunch 2 pi t_H (Om/2) (Om-1)^-3/2; the antipode is reached at the crunch only.
    const c = universe({ Om0: 2, Ode0: 0 })
    expect(relativeError(c.universe.recollapseAgeGyr ?? 0, 2 * Math.PI * c.hubbleTimeGyr)).toBeLessThan(EXACT)
    expect(relativeError(c.universe.greatestSizeAgeGyr ?? 0, Math.PI * c.hubbleTimeGyr)).toBeLessThan(EXACT)
    expect(c.universe.turnaroundRedshift).toBeCloseTo(-0.5, 12)
  })

  it('flat, with a negative Lambda: lifetime 2 pi/(3 sqrt|OL|) t_H', () => {
    // a^3 = Om/|OL| sin^2(3/2 sqrt|OL| H0 t).
    const c = universe({ Om0: 1.5, Ode0: -0.5 })
    const lifetime = ((2 * Math.PI) / 3 / Math.sqrt(0.5)) * c.hubbleTimeGyr
    expect(relativeError(c.universe.recollapseAgeGyr ?? 0, lifetime)).toBeLessThan(EXACT)
    expect(relativeError(1 / (1 + (c.universe.turnaroundRedshift ?? 0)), 3 ** (1 / 3))).toBeLessThan(EXACT)
  })

  it('flat, matter and Lambda: speeding up since (2 OL/Om)^1/3 - 1', () => {
    const { universe: found } = universe({ Om0: 0.3, Ode0: 'flat' })
    expect(relativeError(found.acceleratingSinceRedshift ?? 0, (1.4 / 0.3) ** (1 / 3) - 1)).toBeLessThan(
      EXACT,
    )
  })

  it('a closed space past its equator: the volume goes on growing to 2 pi^2 R^3', () => {
    const c = universe({ Om0: 0.3, Ode0: 1.7 })
    const far = c.antipodeRedshift ?? 0
    const whole = 2 * Math.PI ** 2 * (c.hubbleDistanceMpc / Math.sqrt(-c.Ok0)) ** 3
    expect(relativeError(c.comovingVolumeMpc3(far * (1 - 1e-9)), whole)).toBeLessThan(1e-9)
    expect(c.transverseComovingMpc(far * (1 - 1e-9)) / c.hubbleDistanceMpc).toBeLessThan(1e-8)
  })

  it('bounce of Lambda in closed space without matter: a = cosh', () => {
    // Om = 0, OL > 1: a(t) = a_b cosh(sqrt(OL) H0 t), a_b = sqrt((OL-1)/OL).
    const c = universe({ Om0: 0, Ode0: 1.5 })
    const aB = Math.sqrt(0.5 / 1.5)
    expect(relativeError(c.universe.turnaroundRedshift ?? 0, 1 / aB - 1)).toBeLessThan(EXACT)
    const turned = (c.hubbleTimeGyr / Math.sqrt(1.5)) * Math.acosh(1 / aB)
    expect(relativeError(c.universe.turnaroundGyr ?? 0, turned)).toBeLessThan(EXACT)
    for (const a of [0.999, 0.9, 0.7, 0.6, 0.58, aB * 1.0001, aB * (1 + 1e-10)]) {
      const time = (c.hubbleTimeGyr / Math.sqrt(1.5)) * (Math.acosh(1 / aB) - Math.acosh(a / aB))
      // a/aB is rounded before its arc cosine is taken: near the turn that alone is 1e-6.
      expect(relativeError(c.lookbackGyr(1 / a - 1), time)).toBeLessThan(a < 0.57736 ? 1e-6 : 1e-10)
    }
  })

  it('the static universe: both Friedmann equations are zero, and it is unstable', () => {
    // Lambda = 4 pi G rho/c^2 means OL = Om/2 and curvature -3/2 Om: approached from Om -> infinity at rest.
    // E^2 - (1+z)^2 = Om((1+z)^3 - 3/2 (1+z)^2 + 1/2) has a double zero at z = 0; next to it the growth rate is
    // sqrt(Lambda) c = sqrt(3 OL) H0: Om 3/2 x^2 = 3 OL x^2. Cubic terms of x = 0.001 leave some 0.1 %.
    const Om0 = 900
    const c = universe({ Om0, Ode0: Om0 / 2 })
    const scaled = (x: number): number => (c.E(Math.expm1(x)) ** 2 - Math.exp(2 * x)) / Om0
    expect(Math.abs(scaled(1e-3) / (1.5 * 1e-6) - 1)).toBeLessThan(3e-3)
    expect(Math.abs(scaled(-1e-3) / (1.5 * 1e-6) - 1)).toBeLessThan(3e-3)
  })

  it('big rip at constant w: t = 2/(3|1+w|) t_H for dark energy alone', () => {
    // Caldwell, Kamionkowski & Weinberg 2003, with Om = 0.
    const c = universe({ Om0: 0, Ode0: 'flat', w0: -1.5 })
    expect(relativeError(c.universe.ripInGyr ?? 0, (2 / 1.5) * c.hubbleTimeGyr)).toBeLessThan(EXACT)
  })

  it('curvature goes to zero smoothly', () => {
    for (const small of [1e-3, 1e-5, 1e-8]) {
      const open = universe({ Ode0: 0.7 - small })
      const closed = universe({ Ode0: 0.7 + small })
      const flat = universe({ Ode0: 'flat' })
      for (const z of [0.01, 1, 10]) {
        const middle = 0.5 * (open.comovingVolumeMpc3(z) + closed.comovingVolumeMpc3(z))
        expect(relativeError(middle, flat.comovingVolumeMpc3(z))).toBeLessThan(30 * small * small + 1e-11)
      }
    }
  })

  it('flat models have no curvature at all, and z = 0 is exact', () => {
    const c = createCosmology({
      ...universe({}).parameters,
      Ode0: 'flat',
      Tcmb0: 2.7255,
      Neff: 3.046,
      mNuEv: [0.06],
    })
    expect(c.Ok0).toBe(0)
    expect([c.comovingMpc(0), c.luminosityMpc(0), c.lookbackGyr(0), c.comovingVolumeMpc3(0)]).toEqual([
      0, 0, 0, 0,
    ])
    expect(c.E(0)).toBeCloseTo(1, 14)
  })

  it('massive neutrinos are matter late and radiation early', () => {
    // Omega_nu h^2 = sum m / 93.14 eV, good to some 0.5 % (Mangano et al. 2005) for the whole of Neff.
    const c = universe({ H0: 100, Tcmb0: 2.7255, Neff: 3.046, mNuEv: [1, 1, 1], Ode0: 'flat', Om0: 0.2 })
    const photons = universe({ H0: 100, Tcmb0: 2.7255, Neff: 0, Om0: 0.2 }).Or0
    expect((c.Or0 - photons) * 93.14).toBeGreaterThan(3 * 0.99)
    expect((c.Or0 - photons) * 93.14).toBeLessThan(3 * 1.01)
  })
})
