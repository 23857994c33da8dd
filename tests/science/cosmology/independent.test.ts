import { describe, expect, it } from 'vitest'
import {
  cosmologyQuantities,
  createCosmology,
  type CosmologyParameters,
  type CosmologyQuantity,
  type Universe,
} from '../../../lib/science/cosmology'
import { fixture } from '../support/fixture'
import { relativeError } from '../support/relativeError'
import { universe } from '../support/models'

type Column =
  CosmologyQuantity | 'z' | 'tightComovingMpc' | 'tightLookbackGyr' | 'astropyAgeGyr' | 'astropyVolumeMpc3'

interface Model {
  name: string
  parameters: CosmologyParameters
  Ok0: number
  rows: (Partial<Record<Column, number>> & { z: number })[]
  pairs: { z1: number; z2: number; angularDiameterMpc: number }[]
}

type Odd = Pick<CosmologyParameters, 'name' | 'H0' | 'Om0' | 'Ode0' | 'w0' | 'wa'> & Partial<Universe>

const { source, models, odd } = fixture<{ source: string; models: Model[]; odd: Odd[] }>('cosmology')

/**
 * Independent code: tests/reference/cosmology.py with Astropy 5.2.1. Volumes come from quadrature there,
 * because Astropy's closed form loses digits at small z in nearly flat space, and past the equator of a
 * closed space takes the wrong branch of the arcsine. Ages too: its own integral to infinity is off by up to
 * 3e-6 at z = 1100.
 * Tolerances: 1e-8 to z = 20 and 1e-6 at z = 1100 are what is promised. Quadrature noise of the reference is
 * some 1e-10. Seen to fail: with (4/11)^(1/3) rounded to 0.71 52 rows fail.
 */
const promised = (z: number): number => (z > 20 ? 1e-6 : 1e-8)

/** The largest error of a column over what is allowed, and where. */
function worst(model: Model, column: Column, value: (z: number) => number, allowed: (z: number) => number) {
  const found = { z: -1, share: 0, compared: 0 }
  for (const row of model.rows) {
    const { z } = row
    const expected = row[column]
    if (expected === undefined) {
      expect(z, `${column} is given at every redshift but 0`).toBe(0)
      continue
    }
    found.compared += 1
    // q crosses zero and the reference differentiates numerically: 1e-8 of a quantity of order 1.
    const error = column === 'q' ? Math.abs(value(z) - expected) : relativeError(value(z), expected)
    // Written so that a NaN counts as an error.
    if (!(error / allowed(z) <= found.share)) Object.assign(found, { z, share: error / allowed(z) })
  }
  return found
}

describe(`independent code: ${source}`, () => {
  it('has fourteen models of 44 redshifts, and every quantity of the engine', () => {
    expect(models.map(({ rows }) => rows.length)).toEqual(Array.from({ length: 14 }, () => 44))
    expect(models[0]?.rows[1]).toMatchObject(
      Object.fromEntries(cosmologyQuantities.map((quantity) => [quantity, expect.any(Number)])),
    )
  })

  describe.each(models)('$name', (model) => {
    const cosmology = createCosmology(model.parameters)

    it.each(cosmologyQuantities)('%s', (quantity) => {
      const found = worst(model, quantity, cosmology[quantity], promised)
      expect(found.compared).toBeGreaterThanOrEqual(43)
      expect(found.share, `error over what is allowed, at z = ${found.z}`).toBeLessThan(1)
    })

    it('distance and time by tight quadrature of the same E(z): 1e-11', () => {
      const tight = () => 1e-11
      expect(worst(model, 'tightComovingMpc', cosmology.comovingMpc, tight).share).toBeLessThan(1)
      expect(worst(model, 'tightLookbackGyr', cosmology.lookbackGyr, tight).share).toBeLessThan(1)
      expect(worst(model, 'comovingVolumeMpc3', cosmology.comovingVolumeMpc3, tight).share).toBeLessThan(10)
      expect(worst(model, 'ageGyr', cosmology.ageGyr, tight).share).toBeLessThan(10)
    })

    it('curvature and distances between two redshifts', () => {
      expect(Math.abs(cosmology.Ok0 - model.Ok0)).toBeLessThan(1e-12)
      expect(model.pairs).toHaveLength(7)
      for (const { z1, z2, angularDiameterMpc } of model.pairs) {
        // Near pairs are a small difference of large distances in the reference.
        const limit = Math.abs(z1 - z2) < 0.01 ? 1e-6 : 1e-8
        expect(relativeError(cosmology.angularDiameterBetweenMpc(z1, z2), angularDiameterMpc)).toBeLessThan(
          limit,
        )
      }
    })
  })

  it('differs from Astropy past the equator of a closed space, where Astropy is wrong', () => {
    const model = models.find(({ name }) => name === 'closed past the equator')
    const row = model?.rows.find(({ z }) => z === 1100)
    expect((row?.astropyVolumeMpc3 ?? NaN) / (row?.comovingVolumeMpc3 ?? NaN)).toBeLessThan(0.7)
  })
})

describe('independent code: turns, ends and epochs by roots and quadrature with scipy', () => {
  const facts = [
    'ageGyr',
    'turnaroundRedshift',
    'turnaroundGyr',
    'greatestSizeInGyr',
    'recollapseAgeGyr',
    'ripInGyr',
    'acceleratingSinceRedshift',
  ] as const

  it.each(odd)('$name', ({ name: _, ...given }) => {
    const found = universe(given).universe
    const known = facts.filter((fact) => fact in given)
    expect(known.length).toBeGreaterThanOrEqual(2)
    for (const fact of known) {
      const error = relativeError(found[fact] ?? NaN, given[fact] ?? NaN)
      if (given[fact] === null) expect({ [fact]: found[fact] }).toEqual({ [fact]: null })
      else expect(error < 1e-10, `${fact} is off by ${error}`).toBe(true)
    }
  })
})
