import { separationArcsec, type Place } from '@/lib/science/sky'

/** Positions of one source in different catalogues agree to better than this, arcsec. */
export const samePlaceArcsec = 5

/**
 * In one mode the signal-to-noise ratio of a faint source grows as the root of the time: half the time reaches 0.7 of
 * it, which counts as the same depth. Much less is another, shallower measurement.
 */
const sameDepthShare = 0.5

/** An observation as far as it can clash: where, with what, and how long. */
export interface Claim extends Place {
  modeId: number
  seconds: number
}

/** Same position and mode. */
export const isSamePointing = (a: Place & { modeId: number }, b: Place & { modeId: number }): boolean =>
  a.modeId === b.modeId && separationArcsec(a, b) <= samePlaceArcsec

/** Whether what is held makes a new request superfluous: same position and mode, and deep enough. */
export const clashes = (asked: Claim, held: Claim): boolean =>
  isSamePointing(asked, held) && held.seconds > 0 && held.seconds >= sameDepthShare * asked.seconds
