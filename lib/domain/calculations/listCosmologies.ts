import { cosmologyPresets, presetCosmology } from '@/lib/science/cosmology'
import { describeCosmology } from './computeCosmology'

/** The presets with their citations, their standing and their parameters. */
export function listCosmologies() {
  return cosmologyPresets.map(({ id, citation, standing }) => ({
    id,
    citation,
    standing,
    ...describeCosmology(presetCosmology(id)),
  }))
}
