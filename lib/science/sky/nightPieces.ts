import { sharedAlmanac, TURN_DEG_PER_DAY, type Almanac } from './almanac'
import { darkPart } from './darkPart'
import { intersect, without, type Interval } from './intervals'
import { moonTooBright } from './moonLimits'
import { createNightSky, type NightSky } from './nightSky'
import { createObserver, type Observer } from './observer'
import { dateOf } from './time'
import type { Site } from './types'

/** A part of one night's dark time: within two hours of sidereal time, under one class of moonlight. */
export interface NightPiece {
  /** Index of the night as given. */
  readonly night: number
  readonly from: Date
  readonly to: Date
  /** Sidereal time at which its two hours begin: 0, 2 ... 22. */
  readonly siderealFromH: number
  /** Index of its class of moonlight, as given. */
  readonly moonClass: number
}

export interface NightPiecesInput {
  readonly site: Site
  /** Evening dates with the part of the dark time that counts, 0 to 1. */
  readonly nights: readonly { readonly date: string; readonly from: number; readonly to: number }[]
  readonly twilightLimitDeg?: number
  /** Largest illuminated fraction of a Moon that is up, class by class, growing; the last class takes the rest. */
  readonly moonClasses: readonly number[]
  readonly almanac?: Almanac
}

const BIN_DEG = 30

/** Cuts times where the sidereal time passes an even hour. */
function cutBySidereal(
  observer: Observer,
  [from, to]: Interval,
): { piece: Interval; siderealFromH: number }[] {
  const start = observer.siderealDeg(from)
  const found: { piece: Interval; siderealFromH: number }[] = []
  for (let k = Math.floor(start / BIN_DEG); ; k += 1) {
    const low = Math.max(from, from + (k * BIN_DEG - start) / TURN_DEG_PER_DAY)
    const high = Math.min(to, from + ((k + 1) * BIN_DEG - start) / TURN_DEG_PER_DAY)
    if (high > low) found.push({ piece: [low, high], siderealFromH: (2 * k) % 24 })
    if (high >= to) return found
  }
}

/** Dark times by class of moonlight: each class is what the ones before it leave. */
function byMoon(
  almanac: Almanac,
  sky: NightSky,
  dark: readonly Interval[],
  classes: readonly number[],
): Interval[][] {
  const cuts = classes.map((maxIllumination) => moonTooBright(almanac, sky, { maxIllumination }))
  return [...cuts, []].map((tooBright, index) => {
    const within = without(dark, tooBright)
    const before = cuts[index - 1]
    return before ? intersect(within, before) : within
  })
}

/**
 * The dark time of nights cut by sidereal time and by moonlight, for laying observations into. Pieces follow one
 * another without gap or overlap: together they are the dark time. Edges to a tenth of a second.
 */
export function nightPieces(input: NightPiecesInput): NightPiece[] {
  const { site, nights, twilightLimitDeg = -18, moonClasses, almanac = sharedAlmanac } = input
  const observer = createObserver(site, almanac)
  return nights.flatMap(({ date, from, to }, night) => {
    const sky = createNightSky(observer, almanac, date)
    const dark = darkPart(sky.darkness(twilightLimitDeg), from, to)
    return byMoon(almanac, sky, dark, moonClasses).flatMap((intervals, moonClass) =>
      intervals.flatMap((interval) =>
        cutBySidereal(observer, interval).map(({ piece: [low, high], siderealFromH }): NightPiece => ({
          night,
          from: dateOf(low),
          to: dateOf(high),
          siderealFromH,
          moonClass,
        })),
      ),
    )
  })
}
