import type { Geometry } from '../types'
import type { Mixture } from './mixture'
import { moffatMixture } from './moffatMixture'
import { sersicMixture } from './sersicMixture'
import { convolved, fullWidth } from './widths'

/** How the light of a source lies on the detector; `light` is null where it is as bright everywhere. */
export interface SourceImage {
  readonly light: Mixture | null
  /** Full width at half maximum of the source as delivered; of a point where the source is uniform. */
  readonly imageArcsec: number
}

/** The image of a source whose points are delivered with a full width at half maximum, arcseconds. */
export function sourceImage(pointArcsec: number, geometry: Geometry): SourceImage {
  if (geometry.kind === 'uniform') return { light: null, imageArcsec: pointArcsec }
  const point = moffatMixture(pointArcsec)
  if (geometry.kind === 'point') return { light: point, imageArcsec: pointArcsec }
  const own = sersicMixture(geometry.effectiveRadiusArcsec, geometry.sersicIndex ?? 1)
  const light = convolved(own, point)
  return { light, imageArcsec: fullWidth(light) }
}
