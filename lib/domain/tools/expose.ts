import {
  exposure,
  faintest,
  type Conditions,
  type ExposureInput as Engine,
  type ExposureReport,
  type Geometry,
  type Source,
} from '@/lib/science/exposure'
import { bands, toAb } from '@/lib/science/light'
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

function sourceOf(asked: ExposureInput): Source {
  const shared = { geometry: geometryOf(asked), provenance: 'observed' } as const
  if (asked.source === 'line')
    return {
      ...shared,
      kind: 'line',
      fluxErgSCm2: asked.solve === 'limit' ? 1e-16 : value(asked.flux),
      wavelengthA: value(asked.wavelength),
      widthKmS: value(asked.width),
    }
  const { band, system } = readBandChoice(asked.band) ?? { band: 'r', system: 'AB' }
  const magnitude = asked.solve === 'limit' ? 20 : value(asked.magnitude)
  return { ...shared, kind: 'magnitude', ab: toAb(magnitude, system, band) }
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
function faintestOf(engine: Omit<Engine, 'solve'>, asked: ExposureInput): Exposed {
  const [timeS, snr] = [value(asked.hours) * 3600, value(asked.snr)]
  const limit = faintest({ ...engine, timeS, snr })
  if (limit.kind === 'line') {
    const source = { ...engine.source, fluxErgSCm2: limit.fluxErgSCm2 } as Source
    return { report: exposure({ ...engine, source, solve: 'snr', timeS }), limit }
  }
  const { band, system } = readBandChoice(asked.band) ?? { band: 'r', system: 'AB' }
  const offset = toAb(0, system, band)
  const source = { ...engine.source, ab: limit.ab } as Source
  return {
    report: exposure({ ...engine, source, solve: 'snr', timeS }),
    limit: { kind: 'magnitude', value: limit.ab - offset },
  }
}

/** The exposure asked for, or the sentence why there is none. */
export function expose(asked: ExposureInput, mode: ModeRecord, site: SiteRecord): ExposureAnswered {
  const engine = {
    mode: scienceMode(mode),
    source: sourceOf(asked),
    conditions: conditionsOf(asked, site),
    per: mode.kind === 'imaging' ? ('image' as const) : ('resolution-element' as const),
  }
  try {
    if (asked.solve === 'limit') return { exposed: faintestOf(engine, asked), refusal: null }
    const question =
      asked.solve === 'time'
        ? ({ solve: 'time', snr: value(asked.snr) } as const)
        : ({ solve: 'snr', timeS: value(asked.hours) * 3600 } as const)
    return { exposed: { report: exposure({ ...engine, ...question }), limit: null }, refusal: null }
  } catch (error) {
    if (error instanceof ScienceError) return { exposed: null, refusal: error.message }
    throw error
  }
}

/** Far from the band it was measured in, a magnitude stands for a source flat in f_nu: what the page must say. */
export function isFarFromBand(asked: ExposureInput, wavelengthA: number): boolean {
  if (asked.source === 'line' || asked.solve === 'limit') return false
  const band = bands[readBandChoice(asked.band)?.band ?? '']
  return band !== undefined && Math.abs(Math.log(wavelengthA / band.wavelengthA)) > 0.15
}
