import { brent } from '../numeric/brent'
import { ScienceError } from '../ScienceError'
import { exposure, type ExposureInput } from './exposure'
import type { Source } from './types'

export interface FaintestInput extends Omit<ExposureInput, 'solve' | 'snr' | 'timeS'> {
  /** Open shutter, seconds. */
  readonly timeS: number
  readonly snr: number
}

/** The faintest source of a kind that reaches a signal-to-noise ratio in a time. */
export type Faintest =
  | { readonly kind: 'magnitude'; readonly ab: number }
  | { readonly kind: 'line'; readonly fluxErgSCm2: number }

const BRIGHT_AB = -5
const FAINT_AB = 49

/** The source made fainter or brighter: to an AB magnitude, or a line to the flux 10^(-0.4 m) erg/s/cm^2. */
function at(source: Source, magnitude: number): Source {
  return source.kind === 'magnitude'
    ? { ...source, ab: magnitude }
    : { ...source, fluxErgSCm2: 10 ** (-0.4 * magnitude) }
}

/**
 * Limiting magnitude, or limiting flux of a line, of a time and a signal-to-noise ratio: the root of S/N against
 * brightness, with the best aperture found anew at each step. Good to 1e-6 mag. Throws a ScienceError 'unreachable'
 * when not even a source of magnitude -5 reaches it in that time.
 */
export function faintest(input: FaintestInput): Faintest {
  const excess = (magnitude: number): number => {
    const report = exposure({ ...input, source: at(input.source, magnitude), solve: 'snr' })
    return Math.log(Math.max(report.snr, 1e-30) / input.snr)
  }
  if (!(input.snr > 0)) throw new ScienceError('bad-parameter', 'The signal-to-noise ratio must be above 0.')
  if (excess(BRIGHT_AB) < 0)
    throw new ScienceError('unreachable', `Nothing reaches S/N ${input.snr} in this time.`)
  const magnitude = brent(excess, BRIGHT_AB, FAINT_AB, 1e-6)
  return input.source.kind === 'magnitude'
    ? { kind: 'magnitude', ab: magnitude }
    : { kind: 'line', fluxErgSCm2: 10 ** (-0.4 * magnitude) }
}
