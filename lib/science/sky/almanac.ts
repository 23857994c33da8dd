import {
  Body,
  GeoMoon,
  GeoVector,
  MakeTime,
  Rotation_EQJ_EQD,
  RotateVector,
  SiderealTime,
  type Vector,
} from 'astronomy-engine'
import { createTrack } from './track'
import { subtract, type Vector3 } from './vector'

/** Degrees the Earth turns against the mean equinox in one day of universal time (Capitaine et al. 2003). */
export const TURN_DEG_PER_DAY = 360.985_647_366_29
/** A sidereal day in days of universal time. */
export const SIDEREAL_DAY = 360 / TURN_DEG_PER_DAY
/** Speed of light, astronomical units a day. */
const LIGHT_AU_PER_DAY = 173.144_632_674

/** Days kept before starting afresh. */
const MOST_DAYS = 20_000

/** The true equator and equinox of a day, and the Earth's motion on it. */
export interface Frame {
  /** Rows of the rotation from J2000: precession and nutation. */
  readonly rotation: readonly [Vector3, Vector3, Vector3]
  /** The Earth's velocity over that of light. */
  readonly velocity: Vector3
}

/**
 * Sun, Moon and the turning Earth, seen from the Earth's centre and referred to the true equator and
 * equinox of date. Each body is computed on a coarse grid once and interpolated, so one almanac, kept
 * for a season, serves any number of sites and targets. Times are days since J2000 (UT).
 */
export interface Almanac {
  /** Apparent Sun, astronomical units. */
  sun(days: number): Vector3
  /** Moon, astronomical units. */
  moon(days: number): Vector3
  /** Greenwich apparent sidereal time, degrees, not reduced to one turn. */
  siderealDeg(days: number): number
  /** What turns a J2000 direction into an apparent one, good for the day of `days`. */
  frame(days: number): Frame
}

function ofDate(days: number, vector: Vector): Vector3 {
  const { x, y, z } = RotateVector(Rotation_EQJ_EQD(MakeTime(days)), vector)
  return [x, y, z]
}

export function createAlmanac(): Almanac {
  const sun = createTrack((days) => ofDate(days, GeoVector(Body.Sun, MakeTime(days), true)), 1)
  const moon = createTrack((days) => ofDate(days, GeoMoon(MakeTime(days))), 0.25)
  const equinox = new Map<number, number>()
  const frames = new Map<number, Frame>()

  /** Sidereal time at the start of a day less its even part: precession and nutation of the equinox. */
  function equinoxDeg(day: number): number {
    const known = equinox.get(day)
    if (known !== undefined) return known
    const rest = SiderealTime(MakeTime(day)) * 15 - TURN_DEG_PER_DAY * day
    // Taken near 280.46 deg, its value at J2000, so that neighbouring days never differ by a turn.
    const near = rest - 360 * Math.round((rest - 280.46) / 360)
    if (equinox.size >= MOST_DAYS) equinox.clear()
    equinox.set(day, near)
    return near
  }

  return {
    sun,
    moon,
    siderealDeg(days) {
      const day = Math.floor(days)
      const f = days - day
      return TURN_DEG_PER_DAY * days + (1 - f) * equinoxDeg(day) + f * equinoxDeg(day + 1)
    },
    frame(days) {
      const day = Math.floor(days)
      const known = frames.get(day)
      if (known) return known
      const { rot } = Rotation_EQJ_EQD(MakeTime(day + 0.5))
      const cell = (i: number, j: number): number => rot[i]?.[j] ?? 0
      const [x, y, z] = subtract(sun(day), sun(day + 1))
      const made: Frame = {
        // astronomy-engine keeps columns first.
        rotation: [
          [cell(0, 0), cell(1, 0), cell(2, 0)],
          [cell(0, 1), cell(1, 1), cell(2, 1)],
          [cell(0, 2), cell(1, 2), cell(2, 2)],
        ],
        velocity: [x / LIGHT_AU_PER_DAY, y / LIGHT_AU_PER_DAY, z / LIGHT_AU_PER_DAY],
      }
      if (frames.size >= MOST_DAYS) frames.clear()
      frames.set(day, made)
      return made
    },
  }
}

/** One almanac for a whole process: the same moments are asked for again and again. Bounded in size. */
export const sharedAlmanac: Almanac = createAlmanac()
