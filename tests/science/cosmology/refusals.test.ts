import { describe, expect, it } from 'vitest'
import {
  cosmologyQuantities,
  parameterTroubles,
  presetCosmology,
  type CosmologyParameters,
} from '../../../lib/science/cosmology'
import { ScienceError } from '../../../lib/science/ScienceError'
import { universe } from '../support/models'

function refusal(run: () => unknown): ScienceError {
  try {
    run()
  } catch (error) {
    if (error instanceof ScienceError) return error
    throw error
  }
  throw new Error('Nothing was refused')
}

describe('refusals are sentences with a code', () => {
  const parameters: [Partial<CosmologyParameters>, string][] = [
    [{ H0: 0 }, 'The Hubble constant H₀ must be above 0 km/s/Mpc.'],
    [{ H0: -70 }, 'The Hubble constant H₀ must be above 0 km/s/Mpc.'],
    [{ H0: NaN }, 'The Hubble constant H₀ must be above 0 km/s/Mpc.'],
    [{ Om0: -0.1 }, 'The matter density Ωm must be 0 or more.'],
    [{ Om0: Infinity }, 'The matter density Ωm must be at most 1000.'],
    [{ H0: 1e9 }, 'The Hubble constant H₀ must be at most 1 000 000 km/s/Mpc.'],
    [{ H0: Infinity }, 'The Hubble constant H₀ must be at most 1 000 000 km/s/Mpc.'],
    [{ Tcmb0: 1e-9 }, 'The background temperature must be 0, or 0.001 K or more.'],
    [{ Ode0: NaN }, 'The dark energy density must be a number between −1000 and 1000.'],
    [{ w0: 50 }, 'w₀ must lie between −20 and 20.'],
    [{ wa: NaN }, 'wₐ must lie between −20 and 20.'],
    [{ Tcmb0: -1 }, 'The background temperature must lie between 0 and 100 K.'],
    [{ Neff: -1 }, 'The number of neutrino species must lie between 0 and 100.'],
    [{ Neff: 3.046, mNuEv: [-0.1] }, 'A neutrino mass must lie between 0 and 1000 eV.'],
    [{ Neff: 2, mNuEv: [0.1, 0.1, 0.1] }, '3 neutrino masses were given for 2 species.'],
  ]
  it.each(parameters)('parameters %o', (change, sentence) => {
    const error = refusal(() => universe(change))
    expect(error.code).toBe('bad-parameter')
    expect(error.message).toBe(sentence)
  })

  it.each([NaN, -1, -2, Infinity, 1e10])('redshift %d', (z) => {
    const cosmology = presetCosmology('planck-2018')
    for (const quantity of ['luminosityMpc', 'ageGyr', 'E', 'comovingVolumeMpc3', 'dimmingMag'] as const) {
      expect(refusal(() => cosmology[quantity](z)).code).toBe('bad-redshift')
    }
  })

  it('a distance wants z of 0 or more; a time may lie ahead', () => {
    const cosmology = presetCosmology('planck-2018')
    expect(refusal(() => cosmology.luminosityMpc(-0.1)).message).toBe(
      'A distance needs a redshift of 0 or more.',
    )
    expect(cosmology.lookbackGyr(-0.1)).toBeLessThan(0)
    expect(cosmology.ageGyr(-0.1)).toBeGreaterThan(cosmology.ageGyr(0))
    expect(refusal(() => cosmology.distanceModulusMag(0)).code).toBe('bad-redshift')
  })

  it('past a bounce, with where the turn is', () => {
    const error = refusal(() => universe({ name: 'My own', Om0: 0.3, Ode0: 1.75 }).luminosityMpc(1.29))
    expect(error.code).toBe('past-the-turn')
    expect(error.message).toBe(
      'My own has no big bang: it turned at z = 0.92, so z = 1.29 does not exist in it.',
    )
  })

  it('past the antipode, with where it is, for what is seen across the sky', () => {
    const closed = universe({ name: 'Closed', Om0: 0.3, Ode0: 1.7 })
    const error = refusal(() => closed.angularDiameterMpc(2))
    expect(error.code).toBe('past-the-antipode')
    expect(error.message).toBe(
      'Closed is closed and its antipode lies at z = 1.38: at z = 2.00 distances repeat.',
    )
    expect(closed.lookbackGyr(2)).toBeGreaterThan(0)
  })

  it('past the greatest size of a universe that falls back', () => {
    const closed = universe({ name: 'Dust', Om0: 2, Ode0: 0 })
    expect(refusal(() => closed.lookbackGyr(-0.6)).message).toBe(
      'Dust stops growing at z = −0.50, so z = −0.60 does not exist in it.',
    )
  })

  it.each([
    [NaN, 'A redshift must be a number.'],
    [Infinity, 'A redshift must be a finite number.'],
    [-Infinity, 'A redshift lies above −1.'],
    [-1, 'A redshift lies above −1.'],
    [1e9, 'z = 1.0 × 10⁹ is too large: the engine stops at z = 10⁹.'],
    [1e300, 'z = 1.0 × 10³⁰⁰ is too large: the engine stops at z = 10⁹.'],
  ])('redshift %d in words', (z, sentence) => {
    const cosmology = presetCosmology('planck-2018')
    for (const quantity of cosmologyQuantities)
      expect(refusal(() => cosmology[quantity](z)).message).toBe(sentence)
  })

  it('every quantity answers for the future or says why not', () => {
    const cosmology = presetCosmology('planck-2018')
    const seenOnly = /Mpc|Mag|Arcsec|Volume/
    for (const quantity of cosmologyQuantities) {
      const timeless = ['hubbleKmSMpc', 'dimmingMag'].includes(quantity)
      if (seenOnly.test(quantity) && !timeless)
        expect(refusal(() => cosmology[quantity](-0.5)).message).toBe(
          'A distance needs a redshift of 0 or more.',
        )
      else expect(Math.abs(cosmology[quantity](-0.5))).toBeLessThan(100)
    }
  })

  it('a number that runs out of range is refused, not Infinity', () => {
    const steep = universe({ Ode0: 'flat', w0: 20, wa: 20 })
    expect(refusal(() => steep.E(9e8)).code).toBe('outside-range')
    expect(refusal(() => steep.q(9e8)).message).toBe(
      'In this model the number asked for is too large to compute.',
    )
  })

  it('each parameter that is wrong is told, at its name', () => {
    const { parameters } = universe({})
    expect(parameterTroubles(parameters)).toEqual({})
    expect(parameterTroubles({ ...parameters, H0: 0, wa: NaN, mNuEv: [1] })).toEqual({
      H0: 'The Hubble constant H₀ must be above 0 km/s/Mpc.',
      wa: 'wₐ must lie between −20 and 20.',
      mNuEv: '1 neutrino mass was given for 0 species.',
    })
  })

  it('hundreds of thousands of redshifts are answered without an array for each', () => {
    const cosmology = presetCosmology('planck-2018')
    const redshifts = Float64Array.from({ length: 400_000 }, (_, i) => i * 1e-4)
    const out = new Float64Array(redshifts.length)
    const grown = [1, 2, 3, 4, 5].map(() => {
      const before = process.memoryUsage()
      for (let i = 0; i < 4; i += 1) cosmology.batch('luminosityMpc', redshifts, out)
      const after = process.memoryUsage()
      return Math.abs(after.heapUsed - before.heapUsed) + Math.abs(after.arrayBuffers - before.arrayBuffers)
    })
    // 1.6 million redshifts a round: one byte each would show. The first rounds also compile and collect.
    expect(Math.min(...grown)).toBeLessThan(400_000)
    expect(out.at(-1)).toBe(cosmology.luminosityMpc(redshifts.at(-1) ?? NaN))
  })
})
