import { exposure, type ExposureReport } from '@/lib/science/exposure'
import { ScienceError } from '@/lib/science/ScienceError'
import type { ModeRecord, SiteRecord } from '../facility/types'
import { scienceMode, scienceSite } from '../observations/scienceRecords'
import type { ExposureInput } from './schema'

const number = (text: string) => Number(text.replace(',', '.').replace('−', '-'))

/** The exposure asked for, or the sentence why there is none. */
export function expose(
  asked: ExposureInput,
  mode: ModeRecord,
  site: SiteRecord,
): { report: ExposureReport; refusal: null } | { report: null; refusal: string } {
  try {
    const report = exposure({
      mode: scienceMode(mode),
      source: {
        kind: 'magnitude',
        ab: number(asked.magnitude),
        geometry: { kind: 'point' },
        provenance: 'observed',
      },
      conditions: {
        site: scienceSite(site),
        airmass: number(asked.airmass),
        seeingArcsec: number(asked.seeing),
        moon: asked.moon,
      },
      solve: 'time',
      snr: number(asked.snr),
      per: mode.kind === 'imaging' ? 'image' : 'resolution-element',
    })
    return { report, refusal: null }
  } catch (error) {
    if (error instanceof ScienceError) return { report: null, refusal: error.message }
    throw error
  }
}
