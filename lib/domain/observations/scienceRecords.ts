import type { Geometry, ModeRecord as ScienceMode, SiteRecord as ScienceSite } from '@/lib/science/exposure'
import type { ModeRecord, SiteRecord } from '../facility/types'
import type { ConstraintSet, Target } from '../proposals/types'

/** Optics and filter or grating together are what the exposure engine calls the instrument. */
const partWords: Readonly<Record<string, string>> = { optics: 'instrument' }

/** An instrument mode as the exposure engine takes it. */
export function scienceMode(mode: ModeRecord): ScienceMode {
  return {
    id: mode.modeId,
    kind: mode.kind,
    wavelengthMinA: mode.wavelengthMinA,
    wavelengthMaxA: mode.wavelengthMaxA,
    medium: mode.medium,
    collectingAreaM2: mode.telescope.collectingAreaM2,
    pixelScaleArcsec: mode.pixelScaleArcsec,
    dispersionAPerPixel: mode.dispersionAPerPixel,
    slitWidthArcsec: mode.slitWidthArcsec,
    resolvingPower: mode.resolvingPower,
    readNoiseE: mode.readNoiseE,
    darkEPerS: mode.darkEPerS,
    fullWellE: mode.fullWellE,
    gainEPerAdu: mode.gainEPerAdu,
    minSubExposureS: mode.minSubExposureS,
    maxSubExposureS: mode.maxSubExposureS,
    systematicFloor: mode.systematicFloor,
    throughput: mode.throughput,
    throughputIncludes: mode.throughputIncludes.map((part) => partWords[part] ?? part),
    band: mode.band,
    twilightLimitDeg: mode.twilightLimitDeg,
    overheads: mode.overheads,
    // A version that was frozen before these were recorded holds none of them.
    skySubtraction: mode.skySubtraction ?? 'around',
    backgroundPixels: mode.backgroundPixels ?? undefined,
    thermalEPerS: mode.thermalEPerS ?? 0,
    opticsArcsec: mode.opticsArcsec ?? 0,
    dispersionCorrected: mode.dispersionCorrected ?? false,
  }
}

/** A site as the exposure engine takes it. */
export function scienceSite(site: SiteRecord): ScienceSite {
  return {
    latitudeDeg: site.latitudeDeg,
    longitudeDeg: site.longitudeDeg,
    elevationM: site.elevationM,
    utcOffsetHours: site.utcOffsetHours,
    lowestAltitudeDeg: site.lowestAltitudeDeg,
    extinctionMagPerAirmass: site.extinctionMagPerAirmass,
    darkSkyMagArcsec2: site.darkSkyMagArcsec2,
    seeingQuantilesArcsec: site.seeingArcsec,
  }
}

/** The shape of a target as the exposure engine takes it. A uniform one is a disc of its half-light radius. */
export function scienceGeometry(
  target: Pick<Target, 'geometry' | 'effectiveRadiusArcsec' | 'sersicIndex'>,
): Geometry {
  const radius = target.effectiveRadiusArcsec
  if (target.geometry === 'point' || radius === null) return { kind: 'point' }
  return target.geometry === 'sersic'
    ? { kind: 'extended', effectiveRadiusArcsec: radius, sersicIndex: target.sersicIndex ?? 1 }
    : { kind: 'uniform', areaArcsec2: Math.PI * radius ** 2 }
}

/** The brightest Moon accepted, as a class of moonlight. */
export const moonClass = (moon: ConstraintSet['moon']) => (moon === 'any' ? 'bright' : moon)

/** Share of the light that the thickest clouds accepted let through. */
export const transparencyShare: Readonly<Record<ConstraintSet['transparency'], number>> = {
  photometric: 1,
  clear: 0.9,
  'thin-cloud': 0.7,
}
