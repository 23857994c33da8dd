import type { ModeRecord } from '../exposure'
import { restLines } from '../light'
import { vacuumRange } from './featureChecks'
import { telluricBands } from './telluric'

/** What a spectrum is taken for: a redshift, and the feature asked of it, vacuum rest wavelength. */
export interface StripAsked {
  readonly redshift: number
  readonly feature: { readonly name: string; readonly restA: number } | null
}

export interface StripLine {
  readonly name: string
  /** Observed, vacuum, angstroms. */
  readonly atA: number
  readonly isAsked: boolean
}

/** What a strip of a mode's spectrum shows, observed vacuum wavelengths in angstroms. */
export interface LineStrip {
  /** The axis: the range of the mode with a margin, wider where a feature lies outside. */
  readonly fromA: number
  readonly toA: number
  readonly mode: { readonly fromA: number; readonly toA: number }
  /** Bands of the air on the axis, cut to it; heavy ones take more than half of the light. */
  readonly bands: readonly {
    readonly name: string
    readonly fromA: number
    readonly toA: number
    readonly isHeavy: boolean
  }[]
}

/** Water bands this far in the infrared take more than half of the light. */
const HEAVY_FROM_A = 13_000
const MARGIN = 0.06

const askedA = ({ redshift, feature }: StripAsked): number | null =>
  feature ? feature.restA * (1 + redshift) : null

/** The axis and the bands of a strip on which the features asked for all stand. */
export function lineStrip(
  mode: Pick<ModeRecord, 'wavelengthMinA' | 'wavelengthMaxA' | 'medium'>,
  asked: readonly StripAsked[],
): LineStrip {
  const [low, high] = vacuumRange(mode)
  const margin = (high - low) * MARGIN
  const features = asked.flatMap((one) => askedA(one) ?? [])
  const fromA = Math.min(low, ...features) - margin
  const toA = Math.max(high, ...features) + margin
  const bands = telluricBands
    .filter((band) => band.toA > fromA && band.fromA < toA)
    .map((band) => ({
      name: band.name.replace(/^(a|the) /, '').replace(' band', ''),
      fromA: Math.max(fromA, band.fromA),
      toA: Math.min(toA, band.toA),
      isHeavy: band.fromA >= HEAVY_FROM_A,
    }))
  return { fromA, toA, mode: { fromA: low, toA: high }, bands }
}

/**
 * The feature asked for and the lines of the list at its redshift that fall on a strip, the asked one first; a line
 * nearer to one before it than `apartA` is left out, the asked one never.
 */
export function linesOnStrip(
  { fromA, toA }: Pick<LineStrip, 'fromA' | 'toA'>,
  asked: StripAsked,
  apartA: number,
): StripLine[] {
  const { feature, redshift } = asked
  const lines = restLines
    .filter(({ vacuumA }) => vacuumA !== feature?.restA)
    .map(({ name, vacuumA }) => ({ name, atA: vacuumA * (1 + redshift), isAsked: false }))
  const own = feature ? [{ name: feature.name, atA: feature.restA * (1 + redshift), isAsked: true }] : []
  const kept: StripLine[] = own
  for (const line of lines)
    if (line.atA >= fromA && line.atA <= toA && kept.every(({ atA }) => Math.abs(atA - line.atA) >= apartA))
      kept.push(line)
  return kept
}
