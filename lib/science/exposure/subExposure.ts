import { DIGITISATION } from './ccd'
import type { ModeRecord } from './types'

/** Fewest frames, so that a cosmic ray in one can be told from a source. */
export const FEWEST_FRAMES = 3

/** Share of the full well that the brightest pixel may fill: beyond it detectors bend. */
const LINEAR = 0.8
/** Steps of a 16-bit converter. */
const STEPS = 65_535
/** Sky over read noise squared at which read noise adds 5 % to the noise. */
const SKY_OVER_READ = 10

/** Open shutter over the wait between frames: a tenth of the time at most goes into waiting. */
const OPEN_OVER_WAIT = 9

export interface SubExposure {
  readonly seconds: number
  /** Share of what the detector holds that the brightest pixel fills in one sub-exposure. */
  readonly peakFraction: number
  readonly saturates: boolean
}

/** Variance a pixel gains each time it is read: read noise and the rounding of the converter, electrons squared. */
export function readVarianceE2(mode: ModeRecord): number {
  return mode.readNoiseE ** 2 + (DIGITISATION * mode.gainEPerAdu) ** 2
}

/** Electrons a pixel can hold and count. */
export function capacityE(mode: ModeRecord): number {
  return Math.min(mode.fullWellE, mode.gainEPerAdu > 0 ? STEPS * mode.gainEPerAdu : Infinity)
}

/**
 * Length of a sub-exposure: long enough that the sky outweighs the read noise and
 * read-out does not eat the night, short enough to stay linear,
 * and within what the mode allows.
 */
export function chooseSubExposure(mode: ModeRecord, peakPixel: number, skyPerPixel: number): SubExposure {
  const background = skyPerPixel + mode.darkEPerS
  const quiet = background > 0 ? (SKY_OVER_READ * mode.readNoiseE ** 2) / background : Infinity
  const wanted = Math.max(quiet, OPEN_OVER_WAIT * (mode.overheads.readoutS + mode.overheads.ditherS))
  const linear = (LINEAR * capacityE(mode)) / (peakPixel + mode.darkEPerS)
  const longest = Math.min(mode.maxSubExposureS, linear)
  const raw = Math.max(mode.minSubExposureS, Math.min(wanted, longest))
  const seconds = raw >= 10 ? Math.floor(raw) : raw
  const peakFraction = ((peakPixel + mode.darkEPerS) * seconds) / capacityE(mode)
  return { seconds, peakFraction, saturates: peakFraction > 1 }
}
