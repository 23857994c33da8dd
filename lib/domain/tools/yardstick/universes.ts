import { createCosmology, findPreset, presetCosmology, type Cosmology } from '@/lib/science/cosmology'
import { ScienceError } from '@/lib/science/ScienceError'
import { ownName, readOwn, type OwnTroubles } from './ownCosmology'
import { MOST_COSMOLOGIES, type Chosen } from './state'

/** A chosen cosmology, ready to be asked, or what keeps it from being one. */
export interface MeasuredUniverse {
  /** Its place in the list, which gives it its line and colour. */
  place: number
  name: string
  /** Null while own parameters make no universe. */
  cosmology: Cosmology | null
  /** What kind of universe it is, in a sentence or two. */
  sentence: string
  troubles: OwnTroubles
  citation: string
}

/** A universe that can be computed with. */
export type ReadyUniverse = MeasuredUniverse & { cosmology: Cosmology }

export const readyUniverses = (universes: readonly MeasuredUniverse[]): ReadyUniverse[] =>
  universes.filter((universe): universe is ReadyUniverse => universe.cosmology !== null)

/** Universes typed lately: a keystroke elsewhere on the page must not set them up again. */
const kept = new Map<string, Cosmology>()
const MOST_KEPT = 24

function ownUniverse(key: string, make: () => Cosmology): Cosmology {
  const known = kept.get(key)
  if (known) return known
  const made = make()
  if (kept.size >= MOST_KEPT) kept.clear()
  kept.set(key, made)
  return made
}

function universeOf(chosen: Chosen, place: number): MeasuredUniverse {
  if (!chosen.own) {
    const preset = findPreset(chosen.id)
    const cosmology = presetCosmology(chosen.id)
    return {
      place,
      name: preset.parameters.name,
      cosmology,
      sentence: cosmology.universe.sentence,
      troubles: {},
      citation: preset.citation,
    }
  }
  const read = readOwn(chosen.own)
  const name = chosen.own.name.trim() || 'Own parameters'
  const without = (troubles: OwnTroubles): MeasuredUniverse => ({
    place,
    name,
    cosmology: null,
    sentence: Object.values(troubles)[0] ?? 'What is typed makes no universe.',
    troubles,
    citation: '',
  })
  if (!read.ok) return without(read.troubles)
  try {
    const cosmology = ownUniverse(JSON.stringify(read.parameters), () => createCosmology(read.parameters))
    return {
      place,
      name: read.parameters.name,
      cosmology,
      sentence: cosmology.universe.sentence,
      troubles: {},
      citation: `Own parameters, ${ownName(read.parameters).replace(/^Own: /, '')}`,
    }
  } catch (error) {
    if (error instanceof ScienceError) return without({ Om0: error.message })
    throw error
  }
}

/** The chosen cosmologies, and those of them that can be computed with. */
export interface Universes {
  universes: MeasuredUniverse[]
  ready: ReadyUniverse[]
}

/** Sets up what was chosen; kept apart from the rest of the page, so that typing a redshift leaves it as it is. */
export function chosenUniverses(chosen: readonly Chosen[]): Universes {
  const universes = universesOf(chosen)
  return { universes, ready: readyUniverses(universes) }
}

/** The chosen cosmologies in their order, names told apart where two are alike. */
export function universesOf(chosen: readonly Chosen[]): MeasuredUniverse[] {
  const universes = chosen.slice(0, MOST_COSMOLOGIES).map(universeOf)
  return universes.map((universe, index) => {
    const before = universes.slice(0, index).filter(({ name }) => name === universe.name).length
    return before === 0 ? universe : { ...universe, name: `${universe.name} (${before + 1})` }
  })
}
