import { describe, expect, it } from 'vitest'
import { presetCosmology, type InvertibleQuantity } from '../../../lib/science/cosmology'
import { relativeError } from '../support/relativeError'
import { universe } from '../support/models'

const quantities: readonly InvertibleQuantity[] = [
  'lookbackGyr',
  'ageGyr',
  'comovingMpc',
  'luminosityMpc',
  'distanceModulusMag',
]

describe('redshifts from a value', () => {
  it.each(quantities)('%s: the one redshift comes back', (quantity) => {
    const cosmology = presetCosmology('planck-2018')
    for (const z of [1e-4, 0.01, 0.5, 1.678, 6.6145, 20, 1000]) {
      const found = cosmology.redshiftsAt(quantity, cosmology[quantity](z))
      expect(found).toHaveLength(1)
      // Close to the big bang nearly all time has passed: a lookback time then says little about z.
      const limit = quantity === 'lookbackGyr' ? 1e-9 * (1 + z) ** 1.5 : 1e-9
      expect(relativeError(found[0] ?? -1, z)).toBeLessThan(limit)
    }
  })

  it('an angular-diameter distance has two, on both sides of its largest', () => {
    const cosmology = presetCosmology('planck-2018')
    const found = cosmology.redshiftsAt('angularDiameterMpc', 1000)
    expect(found).toHaveLength(2)
    for (const z of found) expect(relativeError(cosmology.angularDiameterMpc(z), 1000)).toBeLessThan(1e-10)
    expect(found[0]).toBeLessThan(1.59)
    expect(found[1]).toBeGreaterThan(1.59)
    expect(cosmology.redshiftsAt('angularDiameterMpc', 3000)).toEqual([])
  })

  it('a luminosity distance has two in a closed space with an antipode', () => {
    const closed = universe({ Om0: 0.3, Ode0: 1.7 })
    const found = closed.redshiftsAt('luminosityMpc', 2000)
    expect(found).toHaveLength(2)
    for (const z of found) expect(relativeError(closed.luminosityMpc(z), 2000)).toBeLessThan(1e-9)
  })

  it('nothing is found where nothing is', () => {
    const cosmology = presetCosmology('planck-2018')
    expect(cosmology.redshiftsAt('lookbackGyr', 20)).toEqual([])
    expect(cosmology.redshiftsAt('ageGyr', 14)).toEqual([])
    expect(cosmology.redshiftsAt('lookbackGyr', -1)).toEqual([])
    expect(cosmology.redshiftsAt('comovingMpc', 0)).toEqual([0])
    expect(() => cosmology.redshiftsAt('comovingMpc', NaN)).toThrow('must be a number')
  })
})
