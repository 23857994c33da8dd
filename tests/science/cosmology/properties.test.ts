import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { createCosmology, type CosmologyParameters } from '../../../lib/science/cosmology'
import { integrate } from '../../../lib/science/numeric/gaussLegendre'
import { ScienceError } from '../../../lib/science/ScienceError'
import { relativeError } from '../support/relativeError'

/** A fixed seed, so that a run can be repeated; thousands of other seeds have been tried by hand. */
const SEED = 20270701

const double = (min: number, max: number): fc.Arbitrary<number> => fc.double({ min, max, noNaN: true })

const parameters: fc.Arbitrary<CosmologyParameters> = fc.record({
  name: fc.constant('Any'),
  H0: double(20, 200),
  Om0: double(0, 2),
  Ode0: fc.oneof(fc.constant('flat' as const), double(-1, 2)),
  w0: double(-2, 0),
  wa: double(-2, 1),
  Tcmb0: fc.oneof(fc.constant(0), fc.constant(2.7255)),
  Neff: fc.constant(3.046),
  mNuEv: fc.oneof(fc.constant([]), fc.constant([0, 0, 0.06]), fc.constant([0.1, 0.2, 0.3])),
})

/** A value, or the refusal. Anything else that is thrown is a fault. */
function attempt(run: () => number): number | ScienceError {
  try {
    return run()
  } catch (error) {
    if (error instanceof ScienceError) return error
    throw error
  }
}

describe('property', () => {
  it('every answer is a finite number or a refusal in words', () => {
    fc.assert(
      fc.property(parameters, double(-1.5, 30), (p, z) => {
        const cosmology = createCosmology(p)
        for (const quantity of [
          'E',
          'luminosityMpc',
          'lookbackGyr',
          'ageGyr',
          'comovingVolumeMpc3',
          'q',
        ] as const) {
          const answer = attempt(() => cosmology[quantity](z))
          if (answer instanceof ScienceError) expect(answer.message).toMatch(/\.$/)
          else expect(Number.isFinite(answer), `${quantity} at ${z}: ${answer}`).toBe(true)
        }
        expect(cosmology.universe.sentence).not.toMatch(/NaN|Infinity|undefined|null/)
      }),
      { numRuns: 200, seed: SEED },
    )
  })

  it('distances agree with one another and grow; lookback and age add up', () => {
    fc.assert(
      fc.property(parameters, double(0.001, 8), double(0.001, 8), (p, a, b) => {
        const cosmology = createCosmology(p)
        const [near, far] = [Math.min(a, b), Math.max(a, b)]
        const distance = attempt(() => cosmology.luminosityMpc(far))
        if (distance instanceof ScienceError) return
        expect(relativeError(cosmology.angularDiameterMpc(far) * (1 + far) ** 2, distance)).toBeLessThan(
          1e-12,
        )
        expect(cosmology.comovingMpc(far)).toBeGreaterThanOrEqual(cosmology.comovingMpc(near))
        const age = attempt(() => cosmology.ageGyr(far))
        if (age instanceof ScienceError) return
        expect(relativeError(age + cosmology.lookbackGyr(far), cosmology.ageGyr(0))).toBeLessThan(1e-9)
      }),
      { numRuns: 200, seed: SEED },
    )
  })

  it('distances between redshifts add up on the way, by the addition theorem of each curvature', () => {
    fc.assert(
      fc.property(parameters, double(0.01, 3), double(0.01, 3), (p, a, b) => {
        const cosmology = createCosmology(p)
        const [z1, z2] = [Math.min(a, b), Math.max(a, b)]
        const there = attempt(() => cosmology.transverseComovingMpc(z2))
        if (there instanceof ScienceError || z2 - z1 < 0.01) return
        const k = cosmology.Ok0 / cosmology.hubbleDistanceMpc ** 2
        const here = cosmology.transverseComovingMpc(z1)
        // Peebles 1993, eq. 13.62, on this side of the equator.
        const equator = Math.PI / 2 / Math.sqrt(Math.max(-k, 1e-30))
        if (cosmology.comovingMpc(z2) > equator) return
        const expected = there * Math.sqrt(1 + k * here ** 2) - here * Math.sqrt(1 + k * there ** 2)
        const found = cosmology.angularDiameterBetweenMpc(z1, z2) * (1 + z2)
        expect(Math.abs(found - expected) / there).toBeLessThan(1e-7)
      }),
      { numRuns: 200, seed: SEED },
    )
  })

  it('what is found from a value has that value', () => {
    fc.assert(
      fc.property(parameters, double(0.01, 10), (p, z) => {
        const cosmology = createCosmology(p)
        const value = attempt(() => cosmology.angularDiameterMpc(z))
        if (value instanceof ScienceError || value <= 0) return
        const found = cosmology.redshiftsAt('angularDiameterMpc', value)
        expect(found.length).toBeGreaterThan(0)
        for (const root of found) {
          expect(relativeError(cosmology.angularDiameterMpc(root), value)).toBeLessThan(1e-6)
        }
      }),
      { numRuns: 100, seed: SEED },
    )
  })

  it('distance and lookback time are the integrals they claim to be, by another rule of quadrature', () => {
    fc.assert(
      fc.property(parameters, double(1e-3, 1100), (p, z) => {
        const cosmology = createCosmology(p)
        const distance = attempt(() => cosmology.comovingMpc(z))
        // Next to a turn the integrand has no smooth rule; analytic bounces are checked elsewhere.
        if (distance instanceof ScienceError || cosmology.universe.origin === 'bounce') return
        const over = (f: (x: number) => number): number => {
          const pieces = Math.ceil(Math.log1p(z) * 40)
          const step = Math.log1p(z) / pieces
          let sum = 0
          for (let i = 0; i < pieces; i += 1) sum += integrate(f, i * step, (i + 1) * step)
          return sum
        }
        const E = (x: number): number => cosmology.E(Math.expm1(x))
        const chi = over((x) => Math.exp(x) / E(x))
        const time = over((x) => 1 / E(x))
        expect(relativeError(distance, cosmology.hubbleDistanceMpc * chi)).toBeLessThan(1e-11)
        expect(relativeError(cosmology.lookbackGyr(z), cosmology.hubbleTimeGyr * time)).toBeLessThan(1e-11)
      }),
      { numRuns: 60, seed: SEED },
    )
  })

  it('lookback time and age go on evenly, into the future too', () => {
    fc.assert(
      fc.property(parameters, double(-0.9, 1000), double(-0.9, 1000), (p, a, b) => {
        const cosmology = createCosmology(p)
        const [near, far] = [Math.min(a, b), Math.max(a, b)]
        const [late, early] = [near, far].map((z) => attempt(() => cosmology.lookbackGyr(z)))
        if (late instanceof ScienceError || early instanceof ScienceError) return
        expect(early).toBeGreaterThanOrEqual(late ?? NaN)
        if (near < 0) expect(late).toBeLessThanOrEqual(0)
        const [old, young] = [near, far].map((z) => attempt(() => cosmology.ageGyr(z)))
        if (old instanceof ScienceError || young instanceof ScienceError) return
        // Past and future meet at z = 0 to rounding.
        expect(young).toBeLessThanOrEqual((old ?? NaN) * (1 + 1e-14))
      }),
      { numRuns: 200, seed: SEED },
    )
  })

  it('every quantity that can be turned round comes back, from random redshifts', () => {
    const invertible = [
      'lookbackGyr',
      'ageGyr',
      'comovingMpc',
      'luminosityMpc',
      'distanceModulusMag',
    ] as const
    fc.assert(
      fc.property(parameters, double(0.01, 10), fc.constantFrom(...invertible), (p, z, quantity) => {
        const cosmology = createCosmology(p)
        const value = attempt(() => cosmology[quantity](z))
        if (value instanceof ScienceError) return
        const found = cosmology.redshiftsAt(quantity, value)
        const nearest = Math.min(...found.map((root) => relativeError(root, z)))
        // Where the quantity hardly changes with z, a value says little about z: then its own value must come back.
        const again = Math.min(...found.map((root) => relativeError(cosmology[quantity](root), value)))
        expect(again).toBeLessThan(1e-10)
        const steps = [z * (1 - 1e-4), z].map((at) => cosmology[quantity](at))
        const steepness = relativeError(steps[0] ?? NaN, steps[1] ?? NaN) / 1e-4
        if (steepness > 0.1) expect(nearest).toBeLessThan(1e-8)
      }),
      { numRuns: 200, seed: SEED },
    )
  })

  it('curvature goes through zero without a step, whatever the rest', () => {
    fc.assert(
      fc.property(parameters, double(0.01, 20), fc.constantFrom(1e-4, 1e-7, 1e-10), (p, z, small) => {
        const flat = createCosmology({ ...p, Ode0: 'flat' })
        const E = attempt(() => flat.E(z))
        if (E instanceof ScienceError) return
        // Small against all else at z, where curvature weighs (1+z)^2.
        const weight = Math.min(1, (E / (1 + z)) ** 2)
        const by = small * weight
        const [closed, open] = [by, -by].map((more) => createCosmology({ ...p, Ode0: flat.Ode0 + more }))
        for (const quantity of [
          'luminosityMpc',
          'comovingVolumeMpc3',
          'lookbackGyr',
          'kpcPerArcsec',
        ] as const) {
          const values = [flat, closed, open].map((c) => (c ? attempt(() => c[quantity](z)) : NaN))
          if (values.some((value) => value instanceof ScienceError)) return
          const [middle, below, above] = values as number[]
          const [down, up] = [(below ?? NaN) - (middle ?? NaN), (above ?? NaN) - (middle ?? NaN)]
          // The steps to either side are opposite to first order, so half their sum is of second order. Where
          // curvature outweighs the rest, so does the rounding of Ode0 itself.
          const second = Math.abs(down + up) / 2
          const first = Math.max(Math.abs(down), Math.abs(up))
          expect(second, `${quantity} at ${z}`).toBeLessThanOrEqual(
            0.05 * first + (1e-12 / weight) * Math.abs(middle ?? NaN),
          )
        }
      }),
      { numRuns: 200, seed: SEED },
    )
  })
})
