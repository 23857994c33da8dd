import { refuse } from '@/lib/errors'
import {
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

/** The source as the engine takes it; its brightness stands open where the limit is sought. */
function sourceOf({ source, solve }: ExposureRequest): Source {
  const isOpen = solve === 'limit'
  if (source.kind === 'magnitude') {
    const ab = source.ab ?? (isOpen ? 20 : undefined)
    return {
      ...source,
      ab: given(ab, 'source.ab', 'Give the AB magnitude of the source.'),
      provenance: 'observed',
    }
  }
  const flux = source.fluxErgSCm2 ?? (isOpen ? 1e-16 : undefined)
  const fluxErgSCm2 = given(flux, 'source.fluxErgSCm2', 'Give the flux of the line, in erg/s/cm².')
  return { ...source, fluxErgSCm2, provenance: 'observed' }
}

/** A source of the limiting brightness. */
function atLimit(source: Source, limit: Faintest): Source {
  if (source.kind === 'magnitude' && limit.kind === 'magnitude') return { ...source, ab: limit.ab }
  if (source.kind === 'line' && limit.kind === 'line') return { ...source, fluxErgSCm2: limit.fluxErgSCm2 }
  return source
}

/** The exposure asked for with a mode at a site; with `limit`, that of the faintest source that reaches the S/N. */
export function solveExposure(
  asked: ExposureRequest,
  mode: ScienceMode,
  site: ScienceSite,
): { report: ExposureReport; limit: Faintest | null } {
  const conditions: Conditions = { ...asked.conditions, site }
  const source = sourceOf(asked)
  const common = { mode, conditions, per: asked.per }
  const snr = () => given(asked.snr, 'snr', 'Give the signal-to-noise wanted.')
  const timeS = () => given(asked.timeS, 'timeS', 'Give the time of open shutter, in seconds.')
  if (asked.solve === 'time') {
    const wanted = snr()
    return { report: refused(() => exposure({ ...common, source, solve: 'time', snr: wanted })), limit: null }
  }
  const open = timeS()
  if (asked.solve === 'snr')
    return { report: refused(() => exposure({ ...common, source, solve: 'snr', timeS: open })), limit: null }
  const wanted = snr()
  const limit = refused(() => faintest({ ...common, source, timeS: open, snr: wanted }))
  const report = refused(() =>
    exposure({ ...common, source: atLimit(source, limit), solve: 'snr', timeS: open }),
  )
  return { report, limit }
}
