import { refuse } from '@/lib/errors'
import {
  colourToMode,
  exposure,
  faintest,
  type Conditions,
  type ExposureReport,
  type Faintest,
  type ModeRecord as ScienceMode,
  type SiteRecord as ScienceSite,
  type Source,
} from '@/lib/science/exposure'
import { ScienceError } from '@/lib/science/ScienceError'
import { asRefused } from './asRefused'
import type { ExposureRequest } from './exposureSchema'

/** Where in the request the fault lies that the engine found. */
const placeOf: Readonly<Partial<Record<ScienceError['code'], string>>> = {
  'bad-source': 'source',
  'outside-range': 'source.wavelengthA',
  'bad-parameter': 'per',
  'bad-mode': 'mode',
  'bad-site': 'mode',
  unreachable: 'snr',
}

function refused<T>(work: () => T): T {
  try {
    return work()
  } catch (error) {
    if (error instanceof ScienceError) throw refuse.field(placeOf[error.code] ?? '', error.message)
    throw error
  }
}

function given(value: number | undefined, field: string, sentence: string): number {
  if (value === undefined) throw refuse.field(field, sentence)
  return value
}

/** Magnitudes between the band given and the mode; null where no band is named, or the source is a line. */
function colourOf({ source }: ExposureRequest, mode: ScienceMode): number | null {
  if (source.kind === 'line') return null
  const { band, spectrum, wavelengthA = 0.5 * (mode.wavelengthMinA + mode.wavelengthMaxA) } = source
  if (spectrum && !band)
    throw refuse.field('source.band', 'A spectrum carries a magnitude from a band: name the band.')
  if (!band) return null
  if (!spectrum) return 0
  const z = spectrum.kind === 'power-law' ? 0 : spectrum.z
  return asRefused('source.spectrum', () =>
    colourToMode(mode, wavelengthA, { shape: spectrum, z, band, isObserved: true }),
  )
}

/** The source as the engine takes it; its brightness stands open where the limit is sought. */
function sourceOf({ source, solve }: ExposureRequest, colourMag: number): Source {
  const isOpen = solve === 'limit'
  if (source.kind === 'magnitude') {
    const { kind, wavelengthA, geometry } = source
    const ab = given(
      source.ab ?? (isOpen ? 20 : undefined),
      'source.ab',
      'Give the AB magnitude of the source.',
    )
    return { kind, wavelengthA, geometry, ab: ab + colourMag, provenance: 'observed' }
  }
  const flux = source.fluxErgSCm2 ?? (isOpen ? 1e-16 : undefined)
  const fluxErgSCm2 = given(flux, 'source.fluxErgSCm2', 'Give the flux of the line, in erg/s/cm².')
  return { ...source, fluxErgSCm2, provenance: 'observed' }
}

/** A limit as the band has it that was named. */
const inBand = (limit: Faintest, colourMag: number): Faintest =>
  limit.kind === 'magnitude' ? { ...limit, ab: limit.ab - colourMag } : limit

/** A source of the limiting brightness. */
function atLimit(source: Source, limit: Faintest): Source {
  if (source.kind === 'magnitude' && limit.kind === 'magnitude') return { ...source, ab: limit.ab }
  if (source.kind === 'line' && limit.kind === 'line') return { ...source, fluxErgSCm2: limit.fluxErgSCm2 }
  return source
}

export interface Solved {
  report: ExposureReport
  /** A magnitude in the band that was named, where one was. */
  limit: Faintest | null
  colourMag: number | null
}

/** The exposure asked for with a mode at a site; with `limit`, that of the faintest source that reaches the S/N. */
export function solveExposure(asked: ExposureRequest, mode: ScienceMode, site: ScienceSite): Solved {
  const conditions: Conditions = { ...asked.conditions, site }
  const colourMag = colourOf(asked, mode)
  const source = sourceOf(asked, colourMag ?? 0)
  const common = { mode, conditions, per: asked.per }
  const snr = () => given(asked.snr, 'snr', 'Give the signal-to-noise wanted.')
  const timeS = () => given(asked.timeS, 'timeS', 'Give the time of open shutter, in seconds.')
  if (asked.solve === 'time') {
    const wanted = snr()
    return {
      report: refused(() => exposure({ ...common, source, solve: 'time', snr: wanted })),
      limit: null,
      colourMag,
    }
  }
  const open = timeS()
  if (asked.solve === 'snr')
    return {
      report: refused(() => exposure({ ...common, source, solve: 'snr', timeS: open })),
      limit: null,
      colourMag,
    }
  const wanted = snr()
  const limit = refused(() => faintest({ ...common, source, timeS: open, snr: wanted }))
  const report = refused(() =>
    exposure({ ...common, source: atLimit(source, limit), solve: 'snr', timeS: open }),
  )
  return { report, limit: inBand(limit, colourMag ?? 0), colourMag }
}
