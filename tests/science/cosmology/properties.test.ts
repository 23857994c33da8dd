import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { createCosmology, type CosmologyParameters } from '../../../lib/science/cosmology'
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
})
