import { cosmologyPresets, presetCosmology } from '@/lib/science/cosmology'
import { formatNumber, formatPercent } from '@/lib/format'
import {
  bluerBy,
  brighterBy,
  furtherBy,
  isPredicted,
  largerBy,
  magnifiedBy,
  neededWith,
  underOther,
  type Change,
  type Needed,
} from './change'
import type { ObservationInput } from './computeObservation'
import { drawnHours, type TargetErrors } from './drawnHours'
import { isForLine } from './isForLine'
import { conditionsOf } from './seasonOf'

export interface HoursUnder extends Needed {
  name: string
}

export interface HoursSpan {
  name: string
  /** Seconds; null where it is not reached. */
  low: number | null
  high: number | null
  /** Open shutter goes as the size to this power; null for what is no size, or not reached. */
  exponentOfSize: number | null
  /** Of its ends, or of a hundred draws, those whose verdict is another one. */
  flips: number
  tried: number
}

export interface HoursHangOn {
  /** As asked, under the proposal's own cosmology. */
  own: Needed
  /** The observation under each current cosmology; empty where the brightness was observed. */
  cosmologies: HoursUnder[]
  /** Within the errors of the target itself: by one sigma each, then all together. */
  errors: HoursSpan[]
  /** At the poorest image accepted, the median of the site and its best tenth. */
  conditions: HoursUnder[]
}

function underCosmologies(input: ObservationInput): HoursUnder[] {
  if (!isPredicted(input) || !((input.target.redshift ?? 0) > 0)) return []
  return cosmologyPresets
    .filter(({ standing }) => standing === 'current')
    .map(({ id, parameters }) => ({
      name: parameters.name,
      ...neededWith(input, underOther(input, presetCosmology(id))),
    }))
}

function spanOf(name: string, own: Needed, ends: readonly Needed[]): HoursSpan {
  const seconds = ends.map((end) => end.seconds ?? Infinity)
  const finite = (value: number) => (Number.isFinite(value) ? value : null)
  return {
    name,
    low: finite(Math.min(...seconds)),
    high: finite(Math.max(...seconds)),
    exponentOfSize: null,
    flips: ends.filter(({ verdict }) => verdict !== own.verdict).length,
    tried: ends.length,
  }
}

/** The error of what is asked for, in magnitudes, with its name; null where none is stated. */
function lightError(input: ObservationInput): { name: string; magnitudes: number } | null {
  const { line, brightness } = input.target
  if (isForLine(input) && line) {
    if (!line.error) return null
    const share = line.error / line.value
    return { name: `${line.name} ± ${formatPercent(share, 0)}`, magnitudes: 2.5 * Math.log10(1 + share) }
  }
  if (!brightness?.error) return null
  return { name: `magnitude ± ${formatNumber(brightness.error, 2)}`, magnitudes: brightness.error }
}

/** Within the error of the size; null where it has none, or states none. */
function sizeSpan(input: ObservationInput, own: Needed): HoursSpan | null {
  const { geometry, effectiveRadiusArcsec: radius, effectiveRadiusErrorArcsec: error } = input.target
  if (geometry === 'point' || !radius || !error) return null
  const [small, large] = [largerBy(input, -error), largerBy(input, error)] as const
  const ends = [neededWith(input, small), neededWith(input, large)] as const
  const open = ends.map(({ openSeconds }) => openSeconds ?? NaN)
  const sizes = [small, large].map(({ target }) => target?.effectiveRadiusArcsec ?? NaN)
  const power =
    Math.log((open[1] ?? NaN) / (open[0] ?? NaN)) / Math.log((sizes[1] ?? NaN) / (sizes[0] ?? NaN))
  return {
    ...spanOf(`size ± ${formatNumber(error, 2)}″`, own, ends),
    exponentOfSize: Number.isFinite(power) ? power : null,
  }
}

/** The error of the spectral index, where its colour counts; 0 where none is stated. */
function indexError(input: ObservationInput): number {
  // A version that was frozen before spectra were asked for holds none.
  const spectrum = input.target.spectrum ?? null
  return spectrum?.kind === 'power-law' && !isForLine(input) ? (spectrum.indexError ?? 0) : 0
}

/** What is drawn of a target's errors: only what the hours of this request hang on. */
function errorsOf(input: ObservationInput): TargetErrors {
  const { target } = input
  const error = target.redshiftError ?? 0
  // Past the redshift where there is nothing, nothing is drawn.
  const isSmall = furtherBy(input, -error) !== null && furtherBy(input, error) !== null
  return {
    redshift: isSmall ? error : 0,
    magnitude: lightError(input)?.magnitudes ?? 0,
    magnification: target.magnification && isPredicted(input) ? (target.magnificationError ?? 0) : 0,
    index: indexError(input),
    size: target.geometry === 'point' ? 0 : (target.effectiveRadiusErrorArcsec ?? 0),
  }
}

function withinErrors(input: ObservationInput, own: Needed): HoursSpan[] {
  const errors = errorsOf(input)
  const { redshift, magnitude, magnification, index } = errors
  const ends = (name: string, ...changes: (Change | null)[]) =>
    spanOf(
      name,
      own,
      changes.map((change) => neededWith(input, change ?? {})),
    )
  const spans: HoursSpan[] = []
  if (redshift > 0)
    spans.push(
      ends(
        `redshift ± ${formatNumber(redshift, redshift < 0.001 ? 5 : 3)}`,
        furtherBy(input, -redshift),
        furtherBy(input, redshift),
      ),
    )
  if (magnitude > 0)
    spans.push(
      ends(lightError(input)?.name ?? '', brighterBy(input, magnitude), brighterBy(input, -magnitude)),
    )
  if (magnification > 0)
    spans.push(
      ends(
        `magnification ${formatNumber(input.target.magnification, 1)} ± ${formatNumber(magnification, 1)}`,
        magnifiedBy(input, magnification),
        magnifiedBy(input, -magnification),
      ),
    )
  const size = sizeSpan(input, own)
  if (size) spans.push(size)
  if (index > 0) {
    const spectrum = input.target.spectrum
    const value = spectrum?.kind === 'power-law' ? spectrum.index : 0
    const name = `α = ${formatNumber(value, 1)} ± ${formatNumber(index, 1)}`
    spans.push(ends(name, bluerBy(input, -index), bluerBy(input, index)))
  }
  if (spans.length > 1) {
    const words = spans.length === 2 ? 'both together' : 'all together'
    const drawn = drawnHours(input, own, errors)
    spans.push({ name: `${words}, 68 of 100`, exponentOfSize: null, tried: 100, ...drawn })
  }
  return spans
}

/** What the hours needed hang on: cosmology where it matters, the target's own errors, and the image. */
export function hoursHangOn(input: ObservationInput): HoursHangOn {
  const { contents, observation } = input
  const set = conditionsOf(contents, observation)
  const image = (name: string, imageQualityArcsec: number): HoursUnder => ({
    name,
    ...neededWith(input, {
      contents: {
        ...contents,
        constraintSets: contents.constraintSets.map((one) => ({ ...one, imageQualityArcsec })),
      },
    }),
  })
  const { median, best10 } = contents.site.seeingArcsec
  const own = neededWith(input, {})
  return {
    own,
    cosmologies: underCosmologies(input),
    errors: withinErrors(input, own),
    conditions: [
      image('the poorest you accept', set.imageQualityArcsec),
      image('the site’s median', median),
      image('its best tenth of nights', best10),
    ],
  }
}
