import { ScienceError } from '../ScienceError'
import { createCosmology } from './createCosmology'
import { cosmologyPresets, type CosmologyId, type CosmologyPreset } from './presets'
import type { Cosmology } from './types'

const kept = new Map<CosmologyId, Cosmology>()

/** The preset with this id. Throws a ScienceError when there is none. */
export function findPreset(id: string): CosmologyPreset {
  const preset = cosmologyPresets.find((candidate) => candidate.id === id)
  if (!preset) throw new ScienceError('unknown-name', `No cosmology is called “${id}”.`)
  return preset
}

/** The cosmology of a preset, set up once in a process. */
export function presetCosmology(id: string): Cosmology {
  const preset = findPreset(id)
  const cosmology = kept.get(preset.id) ?? createCosmology(preset.parameters)
  kept.set(preset.id, cosmology)
  return cosmology
}
