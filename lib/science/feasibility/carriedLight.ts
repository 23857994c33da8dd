import { colourToMode } from '../exposure'
import { isFarFromBand, lymanKnotsA, toAb } from '../light'
import { absorbedMag, lensMag, lostOnTheWayMag } from './onTheWay'
import { sayCarried, sayPlace } from './sayCarried'
import type { CarriedLight, ReportInput } from './types'

/** Where the light is looked at: in the medium of the mode, and in vacuum, angstroms. */
export interface Place {
  readonly inModeA: number
  readonly vacuumA: number
}

/** Without a shape the light is flat in f_nu: the same AB magnitude everywhere, dimmed on the way if predicted. */
function asIfFlat({ target, mode }: ReportInput, ab: number, { vacuumA }: Place): CarriedLight {
  const { brightness } = target
  const isPredicted = brightness?.provenance === 'predicted'
  const isAssumed = brightness !== null && isFarFromBand(brightness.band, vacuumA)
  return {
    ab: isPredicted ? ab + lostOnTheWayMag(target, vacuumA) : ab,
    colourMag: 0,
    isAssumed,
    sentence: isAssumed
      ? `The magnitude is in ${brightness.band} and the light is looked at ${sayPlace(mode, vacuumA)}: it is taken as flat in f_ν between them. State the shape of its spectrum.`
      : null,
  }
}

/**
 * The continuum of a target where a mode sees it: its magnitude carried from its band by the shape of its spectrum,
 * dust and gas on the way counted once, the lens with what is predicted. Null without a magnitude; throws a ScienceError where the spectrum does not reach.
 */
export function carriedLight(input: ReportInput, place: Place): CarriedLight | null {
  const { target, mode } = input
  const { brightness, spectrum } = target
  if (!brightness) return null
  const given = toAb(brightness.value, brightness.system, brightness.band)
  if (!spectrum) return asIfFlat(input, given, place)
  const z = target.redshift ?? 0
  const isObserved = brightness.provenance === 'observed'
  const hasLoss = Boolean(target.galacticEbv) || z > 0
  const colourMag = colourToMode(mode, place.inModeA, {
    shape: spectrum,
    z,
    band: brightness.band,
    isObserved,
    ...(hasLoss && {
      lostMag: (wavelengthA: number) => absorbedMag(target, wavelengthA),
      lostKnotsA: lymanKnotsA(z),
    }),
  })
  return {
    ab: given + colourMag - (isObserved ? 0 : lensMag(target)),
    colourMag,
    isAssumed: false,
    sentence: sayCarried({
      target,
      spectrum,
      band: brightness.band,
      to: sayPlace(mode, place.vacuumA),
      colourMag,
    }),
  }
}
