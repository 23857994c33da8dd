import { describe, expect, it } from 'vitest'
import {
  createCosmology,
  type CosmologyParameters,
  type CosmologyQuantity,
} from '../../../lib/science/cosmology'
import { fixture } from '../support/fixture'
import { relativeError } from '../support/relativeError'

interface Model {
  name: string
  parameters: CosmologyParameters
  Ok0: number
  rows: (Record<string, number> & { z: number; comovingVolumeMpc3: number; astropyVolumeMpc3: number })[]
  pairs: { z1: number; z2: number; angularDiameterMpc: number }[]
}

const { source, models } = fixture<{ source: string; models: Model[] }>('cosmology')

/**
 * Independent code: tests/reference/cosmology.py with Astropy 5.2.1. Volumes come from quadrature there,
 * because Astropy's closed form loses digits at small z in nearly flat space, and past the equator of a
 * closed space takes the wrong branch of the arcsine. Ages too: its own integral to infinity is off by up to
 * 3e-6 at z = 1100.
 * Tolerances: 1e-8 to z = 20 and 1e-6 at z = 1100 are what is promised. Quadrature noise of the reference is
 * some 1e-10. Seen to fail: with (4/11)^(1/3) rounded to 0.71 52 rows fail.
 */
const quantities: readonly CosmologyQuantity[] = [
  'E',
  'hubbleKmSMpc',
  'comovingMpc',
  'transverseComovingMpc',
  'angularDiameterMpc',
  'luminosityMpc',
  'distanceModulusMag',
  'lookbackGyr',
  'ageGyr',
  'comovingVolumeMpc3',
  'differentialVolumeMpc3Sr',
  'kpcPerArcsec',
  'criticalDensityGCm3',
  'Om',
  'Ode',
  'q',
]

describe(`independent code: ${source}`, () => {
  it('has ten models of 31 redshifts', () => {
    expect(models.map((model) => model.rows.length)).toEqual(Array.from({ length: 10 }, () => 31))
  })

  describe.each(models)('$name', (model) => {
    const cosmology = createCosmology(model.parameters)

    it.each(quantities)('%s', (quantity) => {
      const worst = { z: -1, error: 0 }
      for (const row of model.rows) {
        const expected = row[quantity]
        if (expected === undefined) {
          expect(row.z, `${quantity} is given at every redshift but 0`).toBe(0)
          continue
        }
        // q crosses zero and the reference differentiates numerically: 1e-8 of a quantity of order 1.
        const error =
          quantity === 'q'
            ? Math.abs(cosmology.q(row.z) - expected)
            : relativeError(cosmology[quantity](row.z), expected)
        const share = error / (row.z > 20 ? 1e-6 : 1e-8)
        if (share > worst.error) Object.assign(worst, { z: row.z, error: share })
      }
      expect(worst.error, `error over what is allowed, at z = ${worst.z}`).toBeLessThan(1)
    })

    it('curvature and distances between two redshifts', () => {
      expect(Math.abs(cosmology.Ok0 - model.Ok0)).toBeLessThan(1e-12)
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
    expect(row && row.astropyVolumeMpc3 / row.comovingVolumeMpc3).toBeLessThan(0.7)
  })
})
