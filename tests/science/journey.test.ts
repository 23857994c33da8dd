import { describe, expect, it } from 'vitest'
import { presetCosmology } from '../../lib/science/cosmology'
import { parseDeclination, parseRightAscension } from '../../lib/science/sky'
import { fixture } from './support/fixture'
import { relativeError } from './support/relativeError'

interface Journey {
  source: string
  cosmology: string
  objects: {
    name: string
    ra: string
    dec: string
    raDeg: number
    decDeg: number
    redshift: number
    citation: string
    luminosityMpc: number
    angularDiameterMpc: number
    comovingMpc: number
    kpcPerArcsec: number
    distanceModulusMag: number
    lookbackGyr: number
    ageGyr: number
  }[]
}

const journey = fixture<Journey>('journey')

/** Three published objects, from the text of their positions to their distances, by another library. */
describe(`independent code: ${journey.source}`, () => {
  it('has a quasar, a cluster and a galaxy past z = 6', () => {
    expect(journey.objects.map(({ name }) => name)).toEqual(['3C 273', 'Abell 1689', 'Himiko'])
    expect(journey.objects[2]?.redshift).toBeGreaterThan(6)
  })

  it.each(journey.objects)('$name ($citation)', (object) => {
    const cosmology = presetCosmology(journey.cosmology)
    const ra = parseRightAscension(object.ra)
    const dec = parseDeclination(object.dec)
    expect(ra.ok && relativeError(ra.deg, object.raDeg)).toBeLessThan(1e-12)
    expect(dec.ok && relativeError(dec.deg, object.decDeg)).toBeLessThan(1e-12)
    const quantities = [
      'luminosityMpc',
      'angularDiameterMpc',
      'comovingMpc',
      'kpcPerArcsec',
      'distanceModulusMag',
      'lookbackGyr',
      'ageGyr',
    ] as const
    for (const quantity of quantities) {
      expect(relativeError(cosmology[quantity](object.redshift), object[quantity])).toBeLessThan(1e-8)
    }
  })
})
