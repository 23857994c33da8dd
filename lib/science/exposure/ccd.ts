import { ScienceError } from '../ScienceError'

/** Noise of one conversion step of an analogue-to-digital converter, in steps: 1/sqrt(12). */
export const DIGITISATION = 0.289

/** Electrons and seconds; `timeS` is the total over all exposures. */
export interface CcdInput {
  readonly sourceRate: number
  readonly skyRatePerPixel: number
  readonly darkRatePerPixel: number
  /** Electrons a pixel and exposure. */
  readonly readNoise: number
  /** Pixels the source is summed over. */
  readonly pixels: number
  readonly exposures?: number
  /** Pixels the background is measured from; unlimited when not given. */
  readonly backgroundPixels?: number
  /** Electrons a step of the converter, for its noise; left out when not given. */
  readonly gain?: number
  /** Share of the sky that no exposure averages away. */
  readonly systematicFloor?: number
  readonly solve: 'snr' | 'time'
  readonly timeS?: number
  readonly snr?: number
}

export interface CcdResult {
  readonly snr: number
  readonly timeS: number
  readonly signalE: number
  readonly noiseE: number
  /** Variances, electrons squared, that add up to noiseE^2. */
  readonly variance: {
    readonly source: number
    readonly sky: number
    readonly dark: number
    readonly read: number
    readonly floor: number
  }
  /** Slope of ln(time) against ln(source rate) at this S/N: -1 source-limited, -2 background-limited. */
  readonly timeExponent: number
}

function check(input: CcdInput): void {
  const amounts: [number, string][] = [
    [input.sourceRate, 'source'],
    [input.skyRatePerPixel, 'sky'],
    [input.darkRatePerPixel, 'dark'],
  ]
  for (const [rate, name] of amounts) {
    if (!(rate >= 0 && rate < Infinity)) {
      throw new ScienceError('bad-source', `The ${name} rate must be 0 electrons a second or more.`)
    }
  }
  if (!(input.readNoise >= 0))
    throw new ScienceError('bad-mode', 'The read noise must be 0 electrons or more.')
  if (!(input.pixels > 0)) throw new ScienceError('bad-mode', 'The source must cover some of a pixel.')
  if (!((input.exposures ?? 1) >= 1)) throw new ScienceError('bad-mode', 'At least one exposure is needed.')
  const given = input.solve === 'snr' ? input.timeS : input.snr
  if (!(given !== undefined && given > 0 && given < Infinity)) {
    const what = input.solve === 'snr' ? 'The exposure time' : 'The signal-to-noise ratio'
    throw new ScienceError('bad-parameter', `${what} must be above 0.`)
  }
}

/**
 * Signal-to-noise from time, or time from signal-to-noise, of a source summed over n pixels:
 * noise^2 = S t + n (1 + n/nB) (B t + D t + N R^2 + N G^2 sf^2) + (f n B t)^2
 * (Merline & Howell 1995, Exp. Astron. 6, 163, eq. 20, with a systematic floor f). Time in closed form:
 * (S^2 - q^2 c) t^2 - q^2 a t - q^2 b = 0. Throws 'unreachable' when the floor caps S/N below the one asked.
 */
export function ccd(input: CcdInput): CcdResult {
  check(input)
  const { sourceRate: S, pixels: n, exposures = 1, systematicFloor = 0 } = input
  const area = n * (1 + n / (input.backgroundPixels ?? Infinity))
  const skyRate = area * input.skyRatePerPixel
  const darkRate = area * input.darkRatePerPixel
  const readVariance = area * exposures * (input.readNoise ** 2 + (DIGITISATION * (input.gain ?? 0)) ** 2)
  const a = S + skyRate + darkRate
  const b = readVariance
  const c = (systematicFloor * n * input.skyRatePerPixel) ** 2

  const timeS = input.solve === 'snr' ? (input.timeS ?? 0) : timeFor(input.snr ?? 0)
  const signalE = S * timeS
  const variance = {
    source: signalE,
    sky: skyRate * timeS,
    dark: darkRate * timeS,
    read: readVariance,
    floor: c * timeS * timeS,
  }
  const total = variance.source + variance.sky + variance.dark + variance.read + variance.floor
  const noiseE = Math.sqrt(total)
  const snr = noiseE > 0 ? signalE / noiseE : 0
  // From the equation differentiated at constant S/N: 2 S^2 t^2 (ds + dt) = q^2 (S t ds + (a t + 2 c t^2) dt).
  const growth = 2 * total - (a * timeS + 2 * variance.floor)
  const timeExponent = growth > 0 ? -(2 * total - variance.source) / growth : -Infinity
  return { snr, timeS, signalE, noiseE, variance, timeExponent }

  function timeFor(q: number): number {
    if (S === 0) throw new ScienceError('unreachable', 'A source without light never reaches a signal.')
    const lead = S * S - q * q * c
    if (lead <= 0) {
      const cap = (S / Math.sqrt(c)).toPrecision(3)
      throw new ScienceError(
        'unreachable',
        `No exposure reaches S/N ${q}: the sky cannot be subtracted better than ${(100 * systematicFloor).toPrecision(2)} %, which caps S/N at ${cap}.`,
      )
    }
    const linear = q * q * a
    return (linear + Math.sqrt(linear * linear + 4 * lead * q * q * b)) / (2 * lead)
  }
}
