import { cosmologyEngineVersion } from '@/lib/science/cosmology'
import type { ReadyUniverse } from '../universes'

/** One line to cite the numbers by: where each cosmology is printed, the method, the engine. */
export function citationLine(universes: readonly ReadyUniverse[]): string {
  const sources = universes.map(({ name, citation }) =>
    citation.startsWith('Own parameters') ? `${name}: own parameters` : `${name}: ${citation}`,
  )
  return `${sources.join('. ')}. Method after Hogg 1999, astro-ph/9905116; computed with Noctuary, cosmology engine ${cosmologyEngineVersion}.`
}
