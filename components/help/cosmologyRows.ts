import { cosmologyPresets, createCosmology } from '@/lib/science/cosmology'
import type { CosmologyRow } from './CosmologyTable'

/** The cosmologies on offer, with the age each gives; a model without a big bang has none. */
export function cosmologyRows(): CosmologyRow[] {
  return cosmologyPresets.map(({ id, parameters, standing }) => {
    const cosmology = createCosmology(parameters)
    const bounced = cosmology.universe.origin !== 'big-bang'
    return {
      id,
      name: parameters.name,
      H0: parameters.H0,
      Om0: parameters.Om0,
      ageGyr: bounced ? null : cosmology.ageGyr(0),
      standing,
    }
  })
}
