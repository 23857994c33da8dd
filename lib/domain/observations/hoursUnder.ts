import { cosmologyPresets, presetCosmology } from '@/lib/science/cosmology'
import { formatNumber, formatPercent } from '@/lib/format'
import { brighterBy, furtherBy, isPredicted, neededWith, underOther, type Needed } from './change'
import type { ObservationInput } from './computeObservation'
import { drawnHours } from './drawnHours'
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

function spanOf(name: string, ends: readonly Needed[]): HoursSpan {
  const seconds = ends.map((end) => end.seconds ?? Infinity)
  const finite = (value: number) => (Number.isFinite(value) ? value : null)
  return { name, low: finite(Math.min(...seconds)), high: finite(Math.max(...seconds)) }
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

/** Within the error of the lens; null where nothing is predicted or no error is stated. */
function magnificationSpan(input: ObservationInput): HoursSpan | null {
  const { magnification, magnificationError: error } = input.target
  if (!magnification || !error || !isPredicted(input)) return null
  const ends = [magnification + error, Math.max(0.01, magnification - error)].map((value) =>
    neededWith(input, { target: { ...input.target, magnification: value } }),
  )
  return spanOf(`magnification ${formatNumber(magnification, 1)} ± ${formatNumber(error, 1)}`, ends)
}

/** Within the error of the spectral index, where its colour counts; null where none is stated. */
function indexSpan(input: ObservationInput): HoursSpan | null {
  // A version that was frozen before spectra were asked for holds none.
  const spectrum = input.target.spectrum ?? null
  if (spectrum?.kind !== 'power-law' || !spectrum.indexError || isForLine(input)) return null
  const { index, indexError } = spectrum
  const ends = [index - indexError, index + indexError].map((value) =>
    neededWith(input, { target: { ...input.target, spectrum: { ...spectrum, index: value } } }),
  )
  return spanOf(`α = ${formatNumber(index, 1)} ± ${formatNumber(indexError, 1)}`, ends)
}

function withinErrors(input: ObservationInput): HoursSpan[] {
  const redshift = input.target.redshiftError ?? 0
  const light = lightError(input)
  const magnitude = light?.magnitudes ?? 0
  const moved = [furtherBy(input, -redshift), furtherBy(input, redshift)].flatMap((change) => change ?? [])
  const spans: HoursSpan[] = []
  if (redshift > 0 && moved.length === 2)
    spans.push(
      spanOf(
        `redshift ± ${formatNumber(redshift, redshift < 0.001 ? 5 : 3)}`,
        moved.map((change) => neededWith(input, change)),
      ),
    )
  if (magnitude > 0)
    spans.push(
      spanOf(
        light?.name ?? '',
        [magnitude, -magnitude].map((by) => neededWith(input, brighterBy(input, by))),
      ),
    )
  const magnification = magnificationSpan(input)
  if (magnification) spans.push(magnification)
  const index = indexSpan(input)
  if (index) spans.push(index)
  if (redshift > 0 && magnitude > 0 && moved.length === 2)
    spans.push({ name: 'both together, 68 of 100', ...drawnHours(input, { redshift, magnitude }) })
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
  return {
    own: neededWith(input, {}),
    cosmologies: underCosmologies(input),
    errors: withinErrors(input),
    conditions: [
      image('the poorest you accept', set.imageQualityArcsec),
      image('the site’s median', median),
      image('its best tenth of nights', best10),
    ],
  }
}
