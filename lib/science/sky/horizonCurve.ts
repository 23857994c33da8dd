import { DEG_RAD } from '../constants'
import { checkHorizon, type HorizonProfile } from './horizonProfile'
import { sineOf, turningPoints, type Stretch } from './horizonStretch'

/** Pieces are cut to this width, so that a few steps of Newton's find a crossing. */
const WIDEST = 15 * DEG_RAD

/**
 * A horizon at a latitude, cut into pieces along each of which the declination of the horizon only rises or only
 * falls: a star crosses a piece once if its declination lies between those of the piece's ends, and never otherwise.
 */
export interface HorizonCurve {
  readonly sinLat: number
  readonly cosLat: number
  readonly profile: HorizonProfile
  /** Its highest altitude, degrees. */
  readonly highestDeg: number
  /** The pieces in order of azimuth, all around. */
  readonly pieces: readonly Stretch[]
  /** Sine of the declination where each piece begins; the last ends where the first begins. */
  readonly sines: Float64Array
}

function stretchesOf(profile: HorizonProfile): Stretch[] {
  return profile.map(({ azimuthDeg, altitudeDeg }, i) => {
    const after = profile[(i + 1) % profile.length] ?? { azimuthDeg, altitudeDeg }
    const toDeg = after.azimuthDeg + (i + 1 === profile.length ? 360 : 0)
    return {
      from: azimuthDeg * DEG_RAD,
      to: toDeg * DEG_RAD,
      altitude: altitudeDeg * DEG_RAD,
      slope: (after.altitudeDeg - altitudeDeg) / (toDeg - azimuthDeg),
    }
  })
}

function piecesOf(latitude: number, stretch: Stretch): Stretch[] {
  const { from, to, altitude, slope } = stretch
  const width = to - from
  const count = Math.max(1, Math.ceil(width / WIDEST))
  const even = Array.from({ length: count }, (_, i) => from + (width * i) / count)
  const starts = [...new Set([...even, ...turningPoints(latitude, stretch)])].sort((a, b) => a - b)
  return starts.map((start, i) => ({
    from: start,
    to: starts[i + 1] ?? to,
    altitude: altitude + slope * (start - from),
    slope,
  }))
}

const kept = new WeakMap<HorizonProfile, Map<number, HorizonCurve>>()

/** A horizon of one row or more, ready for stars to be held against it; made once for a profile and latitude (radians). */
export function horizonCurve(latitude: number, profile: HorizonProfile): HorizonCurve {
  const known = kept.get(profile) ?? new Map<number, HorizonCurve>()
  kept.set(profile, known)
  const found = known.get(latitude)
  if (found) return found
  checkHorizon(profile)
  const pieces = stretchesOf(profile).flatMap((stretch) => piecesOf(latitude, stretch))
  const curve: HorizonCurve = {
    sinLat: Math.sin(latitude),
    cosLat: Math.cos(latitude),
    profile,
    highestDeg: Math.max(...profile.map(({ altitudeDeg }) => altitudeDeg)),
    pieces,
    sines: Float64Array.from(pieces, (piece) => sineOf(latitude, piece, piece.from).value),
  }
  known.set(latitude, curve)
  return curve
}
