import { describe, expect, it } from 'vitest'
import { presetCosmology, type CosmologyParameters } from '../../../lib/science/cosmology'
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
})
