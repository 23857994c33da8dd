import { minimum } from '../numeric/minimum'
import { ScienceError } from '../ScienceError'
import { backgroundPixels } from './backgroundPixels'
import { ccd, type CcdInput, type CcdResult } from './ccd'
import { computeRates, type Rates } from './rates'
import { exponentOfDistance, type ExposureReport, type Regime } from './report'
import { chooseSubExposure, FEWEST_FRAMES, readVarianceE2, type SubExposure } from './subExposure'
import { overheadOf } from './overhead'
import type { Conditions, ModeRecord, SnrPer, Source } from './types'
import { exposureEngineVersion } from './version'
import { exposureWarnings } from './warnings'

export interface ExposureInput {
  readonly mode: ModeRecord
  readonly source: Source
  readonly conditions: Conditions
  readonly solve: 'snr' | 'time'
  /** Wanted signal-to-noise ratio, to solve for time. */
  readonly snr?: number
  /** Open shutter, seconds, to solve for signal-to-noise. */
  readonly timeS?: number
  /** What the ratio counts: the image when not given, a resolution element for a spectrum. */
  readonly per?: SnrPer
}

type Solve = (pixels: number, rate: number, continuum: number, exposures: number | null) => CcdResult

/** The CCD equation with this mode's detector; read noise as a rate while the number of frames is open. */
function solver(input: ExposureInput, rates: Rates, sub: SubExposure): Solve {
  const { mode } = input
  return (pixels, rate, continuum, exposures) => {
    const readRate = exposures === null ? readVarianceE2(mode) / sub.seconds : 0
    const ccdInput: CcdInput = {
      sourceRate: rate,
      // Continuum under a line is noise: it stands with the dark current, spread over the pixels.
      skyRatePerPixel: rates.skyPerPixel,
      darkRatePerPixel: mode.darkEPerS + continuum / pixels + readRate,
      readNoise: exposures === null ? 0 : Math.sqrt(readVarianceE2(mode)),
      pixels,
      backgroundPixels: backgroundPixels(mode, pixels),
      exposures: exposures ?? 1,
      systematicFloor: mode.systematicFloor,
      solve: input.solve,
      timeS: input.timeS,
      snr: input.snr,
    }
    return ccd(ccdInput)
  }
}

/** Aperture of best signal-to-noise: the variance a second over the signal squared, at its least. */
function bestRadius(rates: Rates, mode: ModeRecord, sub: SubExposure): number {
  const perPixel = rates.skyPerPixel + mode.darkEPerS + readVarianceE2(mode) / sub.seconds
  const cost = (radius: number): number => {
    const { share, continuum, pixels } = rates.aperture(radius)
    const signal = rates.sourceWhole * share
    const area = pixels * (1 + pixels / (backgroundPixels(mode, pixels) ?? Infinity))
    return (signal + continuum + area * perPixel) / (signal * signal)
  }
  return minimum(cost, 0.3 * rates.imageArcsec, 2.5 * rates.imageArcsec, 1e-4)
}

function regimeOf(variance: CcdResult['variance']): { regime: Regime; share: number } {
  const parts: [Regime, number][] = [
    ['source', variance.source],
    ['sky', variance.sky],
    ['read', variance.read + variance.dark],
    ['floor', variance.floor],
  ]
  const total = parts.reduce((sum, [, part]) => sum + part, 0)
  const [regime, part] = parts.reduce((best, next) => (next[1] > best[1] ? next : best))
  return { regime, share: total > 0 ? part / total : 1 }
}

/**
 * Exposure of a source with an instrument mode under conditions, solved for time or for signal-to-noise.
 * Throws a ScienceError when the mode cannot see the wavelength or the floor caps S/N below the one asked.
 */
export function exposure(input: ExposureInput): ExposureReport {
  const { mode, source, conditions } = input
  const per = input.per ?? (mode.kind === 'imaging' ? 'image' : 'resolution-element')
  if (mode.kind === 'imaging' && per !== 'image') {
    throw new ScienceError(
      'bad-parameter',
      'The signal-to-noise of an image counts the whole image of a source.',
    )
  }
  const rates = computeRates(mode, source, conditions, per)
  const preferred = chooseSubExposure(mode, rates.peakPixel, rates.skyPerPixel)
  const radius = bestRadius(rates, mode, preferred)
  const { share, continuum, pixels } = rates.aperture(radius)
  const rate = rates.sourceWhole * share

  const solve = solver(input, rates, preferred)
  const unbroken = solve(pixels, rate, continuum, null)
  const wanted = Math.ceil(unbroken.timeS / preferred.seconds - 1e-9)
  const fitting = input.solve === 'snr' ? Math.floor(unbroken.timeS / mode.minSubExposureS) : Infinity
  const frames = Math.max(1, wanted, Math.min(FEWEST_FRAMES, fitting))
  const broken = solve(pixels, rate, continuum, frames)
  const subExposureS = Math.max(mode.minSubExposureS, broken.timeS / frames)
  const openS = subExposureS * frames
  const reached = solver({ ...input, solve: 'snr', timeS: openS }, rates, preferred)(
    pixels,
    rate,
    continuum,
    frames,
  )
  const { regime, share: regimeShare } = regimeOf(reached.variance)
  const overheadS = overheadOf(mode, frames, openS)
  const peakFraction = (preferred.peakFraction * subExposureS) / preferred.seconds
  return {
    engineVersion: exposureEngineVersion,
    snr: reached.snr,
    per,
    openS,
    subExposures: frames,
    subExposureS,
    overheadS,
    totalS: openS + overheadS,
    signalE: reached.signalE,
    variance: reached.variance,
    regime,
    regimeShare,
    timeExponentOfFlux: unbroken.timeExponent,
    timeExponentOfDistance: exponentOfDistance(unbroken.timeExponent, source.provenance),
    cosmologyMatters: source.provenance === 'predicted',
    wavelengthA: rates.wavelengthA,
    imageArcsec: rates.imageArcsec,
    apertureRadiusArcsec: radius,
    enclosedFraction: share,
    pixels,
    skyAbArcsec2: rates.skyAbArcsec2,
    skyBand: rates.skyBand,
    peakFraction,
    warnings: exposureWarnings(input, { peakFraction, regime, regimeShare, frames }),
  }
}
