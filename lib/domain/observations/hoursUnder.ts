import { cosmologyPresets, presetCosmology, type Cosmology } from '@/lib/science/cosmology'
import { reportOf, type ObservationInput } from './computeObservation'
import { conditionsOf } from './seasonOf'

export interface HoursUnder {
  name: string
  /** Hours needed, overheads included; null when it cannot be reached at all. */
  seconds: number | null
}

export interface HoursHangOn {
  /** The observation under each current cosmology; empty where the brightness was observed. */
  cosmologies: HoursUnder[]
  /** Under the errors of the target itself: fainter and brighter by one sigma. */
  errors: { name: string; low: HoursUnder; high: HoursUnder }[]
  /** At the poorest image accepted, the median of the site and its best tenth. */
  conditions: HoursUnder[]
}

type Change = Partial<Pick<ObservationInput, 'target' | 'contents' | 'cosmology'>>

/** Without a right ascension no night is searched; the declination alone gives the mean airmass of its window. */
function neededWith(input: ObservationInput, change: Change): number | null {
  const { mode } = input
  if (!mode) return null
  const changed = { ...input, ...change, mode }
  const { seasonFrom, seasonTo } = changed.contents.call
  const report = reportOf(changed, seasonFrom, seasonTo, { searchNights: false })
  return report.exposure ? report.exposure.totalS : null
}

function brighterBy(input: ObservationInput, magnitudes: number): Change {
  const { brightness } = input.target
  if (!brightness) return {}
  return { target: { ...input.target, brightness: { ...brightness, value: brightness.value - magnitudes } } }
}

/** A magnitude predicted from a luminosity follows the distance: fainter where the other universe is larger. */
function underCosmology(input: ObservationInput, other: Cosmology): Change {
  const z = input.target.redshift ?? 0
  const ratio = other.luminosityMpc(z) / input.cosmology.luminosityMpc(z)
  return { ...brighterBy(input, -5 * Math.log10(ratio)), cosmology: other }
}

/** What the hours needed hang on: cosmology where it matters, the target's own errors, and the image. */
export function hoursHangOn(input: ObservationInput): HoursHangOn {
  const { target, contents, observation } = input
  const { brightness } = target
  const isPredicted = brightness?.provenance === 'predicted' && (target.redshift ?? 0) > 0
  const current = cosmologyPresets.filter(({ standing }) => standing === 'current')
  const set = conditionsOf(contents, observation)
  const image = (name: string, imageQualityArcsec: number): HoursUnder => ({
    name,
    seconds: neededWith(input, {
      contents: {
        ...contents,
        constraintSets: contents.constraintSets.map((one) => ({ ...one, imageQualityArcsec })),
      },
    }),
  })
  const { median, best10 } = contents.site.seeingArcsec
  return {
    cosmologies: isPredicted
      ? current.map(({ id, parameters }) => ({
          name: parameters.name,
          seconds: neededWith(input, underCosmology(input, presetCosmology(id))),
        }))
      : [],
    errors: brightness?.error
      ? [
          {
            name: `magnitude ± ${brightness.error}`,
            low: { name: 'brighter', seconds: neededWith(input, brighterBy(input, brightness.error)) },
            high: { name: 'fainter', seconds: neededWith(input, brighterBy(input, -brightness.error)) },
          },
        ]
      : [],
    conditions: [
      image('the poorest you accept', set.imageQualityArcsec),
      image('the site’s median', median),
      image('its best tenth of nights', best10),
    ],
  }
}
