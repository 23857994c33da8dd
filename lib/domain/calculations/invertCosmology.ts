import { z } from 'zod'
import { cosmologyEngineVersion } from '@/lib/science/cosmology'
import { eachOrRefused } from './asRefused'
import { describeCosmology } from './computeCosmology'
import { cosmologyInput, universeOf } from './cosmologySchema'
import { exactly } from './exactly'
import { listOf, mostRedshifts } from './limits'

export const inverseRequest = exactly({
  cosmology: cosmologyInput,
  quantity: z.enum(
    ['lookbackGyr', 'ageGyr', 'comovingMpc', 'luminosityMpc', 'angularDiameterMpc', 'distanceModulusMag'],
    'This is the name of a quantity: lookbackGyr, ageGyr, comovingMpc, luminosityMpc, angularDiameterMpc or distanceModulusMag.',
  ),
  values: listOf(z.number('A value is a number.'), mostRedshifts, 'values'),
})

export type InverseRequest = z.output<typeof inverseRequest>

/** Every redshift at which a quantity has each value; an empty list where there is none. */
export function invertCosmology(input: InverseRequest) {
  const universe = universeOf(input.cosmology)
  const { values: rows } = eachOrRefused({
    values: [
      input.values,
      (value: number) => ({ value, redshifts: universe.redshiftsAt(input.quantity, value) }),
    ],
  })
  return {
    engine: cosmologyEngineVersion,
    cosmology: describeCosmology(universe),
    quantity: input.quantity,
    rows,
  }
}
