import type { AskedLine } from './types'

/** A piece of a season on one telescope: a half-month, two hours of sidereal time, a class of moonlight. */
export interface NightBin {
  telescope: number
  /** Half-months since the first of the season. */
  half: number
  /** Sidereal time at which its two hours begin: 0, 2 ... 22. */
  siderealFromH: number
  moon: 'dark' | 'grey' | 'bright'
  /** Dark seconds on offer, whole. */
  seconds: number
}

/** One target with one mode: what it takes, and the seconds of each bin in which it may be observed. */
export interface BinnedPart {
  seconds: number
  /** Index of a bin to whole seconds, above 0. */
  usable: ReadonlyMap<number, number>
}

/** What a proposal asks of one instrument, target by target; the parts add up to its seconds. */
export interface BinnedLine extends AskedLine {
  parts: readonly BinnedPart[]
}

export interface BinnedGiven {
  proposal: number
  instrument: number
  telescope: number
  seconds: number
  /** Index of a bin to the seconds laid there. */
  laid: ReadonlyMap<number, number>
  /** Seconds kept of each part, in the order of the line's parts. */
  parts: readonly number[]
}

export interface BinnedNotGiven {
  proposal: number
  instrument: number
  /** Not usable: even alone, its targets do not find the least of use in the time on offer. */
  reason: 'not-possible' | 'not-usable' | 'too-little-left'
  /** Seconds that were found when its turn came. */
  found: number
}

export interface BinnedPlan {
  given: BinnedGiven[]
  notGiven: BinnedNotGiven[]
}
