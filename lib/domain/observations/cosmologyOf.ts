import { createCosmology, presetCosmology, type Cosmology } from '@/lib/science/cosmology'
import type { ChosenCosmology } from '../proposals/types'
import { boundedMap } from './boundedMap'

const kept = boundedMap<Cosmology>(40)

/** The universe with these parameters, set up once. Throws a ScienceError when there is none. */
export function cosmologyOf(parameters: ChosenCosmology['parameters']): Cosmology {
  return kept.getOr(JSON.stringify(parameters), () => createCosmology(parameters))
}

/** The cosmology shown beside the chosen one, or null. */
export function comparisonOf(chosen: ChosenCosmology): Cosmology | null {
  return chosen.comparisonId === null ? null : presetCosmology(chosen.comparisonId)
}
