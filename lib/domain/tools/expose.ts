import {
  colourToMode,
  exposure,
  faintest,
  type Conditions,
  type ExposureInput as Engine,
  type ExposureReport,
  type Geometry,
  type ModeRecord as ScienceMode,
  type Source,
} from '@/lib/science/exposure'
import { sayCarried, sayPlace } from '@/lib/science/feasibility'
import { isFarFromBand as isFar, toAb, type SpectralShape } from '@/lib/science/light'
import { ScienceError } from '@/lib/science/ScienceError'
import type { ModeRecord, SiteRecord } from '../facility/types'
import { scienceMode, scienceSite, transparencyShare } from '../observations/scienceRecords'
import { readBandChoice } from '../targets/bands'
import { numberOf } from './texts'
import type { ExposureInput } from './exposureSchema'

export interface Exposed {
  report: ExposureReport
  /** The faintest source, when that was asked: AB magnitude as given, or erg/s/cm^2. */
  limit: { kind: 'magnitude'; value: number } | { kind: 'line'; fluxErgSCm2: number } | null
  /** How the magnitude came from its band to the mode, in a sentence; null where no shape is stated. */
  carried: string | null
}

export type ExposureAnswered = { exposed: Exposed; refusal: null } | { exposed: null; refusal: string }

const value = (text: string): number => numberOf(text) ?? NaN

function geometryOf(asked: ExposureInput): Geometry {
  if (asked.shape === 'galaxy')
    return {
      kind: 'extended',
      effectiveRadiusArcsec: value(asked.radius),
      sersicIndex: value(asked.sersic),
    }
  if (asked.shape === 'uniform') return { kind: 'uniform', areaArcsec2: value(asked.area) }
  return { kind: 'point' }
}

function shapeOf({ spectrum, index, temperature }: ExposureInput): SpectralShape | null {
  if (spectrum === 'power-law') return { kind: 'power-law', index: value(index) }
  return spectrum === 'black-body' ? { kind: 'black-body', temperatureK: value(temperature) } : null
}

/** What carries a magnitude from its band to a mode: the middle of its range, or its filter. */
interface Colour {
  readonly mag: number
  readonly sentence: string | null
}

function colourOf(asked: ExposureInput, mode: ScienceMode): Colour {
  const shape = asked.source === 'line' ? null : shapeOf(asked)
  if (!shape) return { mag: 0, sentence: null }
  const { band } = bandOf(asked)
  const z = asked.spectrum === 'black-body' ? value(asked.redshift) : 0
  const middleA = 0.5 * (mode.wavelengthMinA + mode.wavelengthMaxA)
  const mag = colourToMode(mode, middleA, { shape, z, band, isObserved: true })
  const to = sayPlace(mode, middleA)
  return { mag, sentence: sayCarried({ target: { redshift: z }, spectrum: shape, band, to, colourMag: mag }) }
}

const bandOf = (asked: ExposureInput) => readBandChoice(asked.band) ?? ({ band: 'r', system: 'AB' } as const)

function sourceOf(asked: ExposureInput, colour: Colour): Source {
  const shared = { geometry: geometryOf(asked), provenance: 'observed' } as const
  if (asked.source === 'line')
    return {
      ...shared,
      kind: 'line',
      fluxErgSCm2: asked.solve === 'limit' ? 1e-16 : value(asked.flux),
      wavelengthA: value(asked.wavelength),
      widthKmS: value(asked.width),
    }
  const { band, system } = bandOf(asked)
  const magnitude = asked.solve === 'limit' ? 20 : value(asked.magnitude)
  return { ...shared, kind: 'magnitude', ab: toAb(magnitude, system, band) + colour.mag }
}

function conditionsOf(asked: ExposureInput, site: SiteRecord): Conditions {
  return {
    site: scienceSite(site),
    airmass: value(asked.airmass),
    seeingArcsec: value(asked.seeing),
    moon: asked.moon,
    transparency: transparencyShare[asked.clouds],
    slitAngle: asked.slit,
  }
}

/** The faintest source of the kind in a time, and the exposure of just that source. */
function faintestOf(engine: Omit<Engine, 'solve'>, asked: ExposureInput, colour: Colour): Exposed {
  const [timeS, snr] = [value(asked.hours) * 3600, value(asked.snr)]
  const limit = faintest({ ...engine, timeS, snr })
  if (limit.kind === 'line') {
    const source = { ...engine.source, fluxErgSCm2: limit.fluxErgSCm2 } as Source
    return { report: exposure({ ...engine, source, solve: 'snr', timeS }), limit, carried: null }
  }
  const { band, system } = bandOf(asked)
  const offset = toAb(0, system, band) + colour.mag
  const source = { ...engine.source, ab: limit.ab } as Source
  return {
    report: exposure({ ...engine, source, solve: 'snr', timeS }),
    limit: { kind: 'magnitude', value: limit.ab - offset },
    carried: colour.sentence,
  }
}

/** The exposure asked for, or the sentence why there is none. */
export function expose(asked: ExposureInput, mode: ModeRecord, site: SiteRecord): ExposureAnswered {
  try {
    const seenBy = scienceMode(mode)
    const colour = colourOf(asked, seenBy)
    const engine = {
      mode: seenBy,
      source: sourceOf(asked, colour),
      conditions: conditionsOf(asked, site),
      per: mode.kind === 'imaging' ? ('image' as const) : ('resolution-element' as const),
    }
    if (asked.solve === 'limit') return { exposed: faintestOf(engine, asked, colour), refusal: null }
    const question =
      asked.solve === 'time'
        ? ({ solve: 'time', snr: value(asked.snr) } as const)
        : ({ solve: 'snr', timeS: value(asked.hours) * 3600 } as const)
    const report = exposure({ ...engine, ...question })
    return { exposed: { report, limit: null, carried: colour.sentence }, refusal: null }
  } catch (error) {
    if (error instanceof ScienceError) return { exposed: null, refusal: error.message }
    throw error
  }
}

/** Far from the band it was measured in, a magnitude stands for a source flat in f_nu: what the page must say. */
export function isFarFromBand(asked: ExposureInput, wavelengthA: number): boolean {
  if (asked.source === 'line' || asked.spectrum !== 'flat') return false
  return isFar(bandOf(asked).band, wavelengthA)
}
