import { readQuantity } from './reading'
import type { ReadyUniverse } from './universes'

/** What one cosmology in place of another does to an exposure of a source of given luminosity. */
export interface ExposureEffect {
  place: number
  name: string
  /** Luminosity distance over the reference's. */
  distance: number
  /** Time over the reference's where the source's own light limits the noise: t goes as 1/flux, so as D_L². */
  sourceLimited: number
  /** Where the sky limits it: t goes as 1/flux², so as D_L⁴. */
  skyLimited: number
}

/** The effect at one redshift for every cosmology that has it; empty where the reference has not. */
export function exposureEffects(
  z: number,
  universes: readonly ReadyUniverse[],
  reference: ReadyUniverse,
): ExposureEffect[] {
  const base = readQuantity(reference.cosmology, 'luminosityMpc', z).value
  if (base === null || base === 0) return []
  return universes.flatMap(({ place, name, cosmology }) => {
    const value = readQuantity(cosmology, 'luminosityMpc', z).value
    if (place === reference.place || value === null) return []
    const distance = value / base
    return [{ place, name, distance, sourceLimited: distance ** 2, skyLimited: distance ** 4 }]
  })
}
