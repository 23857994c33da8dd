import { minimum } from '../numeric/minimum'
import { slot } from '../numeric/slot'
import { ScienceError } from '../ScienceError'
import { backgroundPixels } from './backgroundPixels'
import type { ExposureInput } from './exposure'
import { computeRates, type Rates } from './rates'
import type { ModeRecord } from './types'
import { chooseSubExposure, FEWEST_FRAMES, readVarianceE2 } from './subExposure'

const REFERENCE_AB = 20
/** Natural logarithms of source over background pixel between which the best aperture is tabled, and the step. */
const FROM = -16
const TO = 26
const STEP = 0.25

interface ApertureTable {
  readonly shares: Float64Array
  readonly pixels: Float64Array
}

/** Best aperture against the ratio of the source's whole rate to that of a background pixel. */
function apertureTable(rates: Rates, mode: ModeRecord): ApertureTable {
  const count = Math.round((TO - FROM) / STEP) + 1
  const shares = new Float64Array(count)
  const pixels = new Float64Array(count)
  for (let i = 0; i < count; i += 1) {
    const ratio = Math.exp(FROM + i * STEP)
    const cost = (radius: number): number => {
      const inside = rates.aperture(radius)
      const signal = ratio * inside.share
      const area = inside.pixels * (1 + inside.pixels / (backgroundPixels(mode, inside.pixels) ?? Infinity))
      return (signal + area) / (signal * signal)
    }
    const best = rates.aperture(minimum(cost, 0.3 * rates.imageArcsec, 2.5 * rates.imageArcsec, 1e-3))
    shares[i] = best.share
    pixels[i] = best.pixels
  }
  return { shares, pixels }
}

function between(values: Float64Array, place: number): number {
  const i = Math.min(values.length - 2, Math.max(0, Math.floor(place)))
  const t = Math.min(1, Math.max(0, place - i))
  return slot(values, i) + t * (slot(values, i + 1) - slot(values, i))
}

/**
 * Open shutter, seconds, for many brightnesses of one kind of source at once: `ab` in, `out` filled, no allocation
 * a value. The same equations as `exposure`, with the best aperture read from a table made once (within 0.1 % of the
 * search). Infinity where the systematic floor keeps the S/N out of reach.
 * The source must be a magnitude; its own value is not used. Throws as `exposure` does for mode and conditions.
 */
export function exposureTimes(
  input: Omit<ExposureInput, 'solve' | 'timeS' | 'snr'> & { readonly snr: number },
  ab: Float64Array,
  out: Float64Array,
): void {
  const { mode, source, conditions, snr } = input
  if (source.kind !== 'magnitude')
    throw new ScienceError('bad-source', 'Many exposures at once are computed for magnitudes only.')
  if (!(snr > 0)) throw new ScienceError('bad-parameter', 'The signal-to-noise ratio must be above 0.')
  const per = input.per ?? (mode.kind === 'imaging' ? 'image' : 'resolution-element')
  const rates = computeRates(mode, { ...source, ab: REFERENCE_AB }, conditions, per)
  const table = apertureTable(rates, mode)
  const readVariance = readVarianceE2(mode)
  const own = rates.peakPixel - rates.skyPerPixel
  for (let i = 0; i < ab.length; i += 1) {
    const brighter = 10 ** (-0.4 * (slot(ab, i) - REFERENCE_AB))
    const whole = rates.sourceWhole * brighter
    const sub = chooseSubExposure(mode, own * brighter + rates.skyPerPixel, rates.skyPerPixel)
    const read = readVariance / sub.seconds
    const background = rates.skyPerPixel + mode.darkEPerS + read
    const place = (Math.log(whole / background) - FROM) / STEP
    const pixels = between(table.pixels, place)
    const signal = whole * between(table.shares, place)
    const area = pixels * (1 + pixels / (backgroundPixels(mode, pixels) ?? Infinity))
    const floor = mode.systematicFloor * pixels * rates.skyPerPixel
    const lead = signal * signal - snr * snr * floor * floor
    out[i] =
      lead > 0
        ? wholeFrames(lead, signal + area * (background - read), area * readVariance, sub.seconds)
        : Infinity
  }

  /** The time in whole frames, three at least: lead t^2 - q^2 a t - q^2 n b = 0 with b the variance of a read. */
  function wholeFrames(lead: number, a: number, b: number, preferredS: number): number {
    const q2 = snr * snr
    const unbroken = (q2 * (a + b / preferredS)) / lead
    const frames = Math.max(FEWEST_FRAMES, Math.ceil(unbroken / preferredS - 1e-9))
    const linear = q2 * a
    const open = (linear + Math.sqrt(linear * linear + 4 * lead * q2 * frames * b)) / (2 * lead)
    return Math.max(open, frames * mode.minSubExposureS)
  }
}
