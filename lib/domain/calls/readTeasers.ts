import { presetCosmology } from '@/lib/science/cosmology'
import { visibility } from '@/lib/science/sky'
import { pointingOf } from '../facility/pointingOf'
import type { CallView } from './readCall'

export interface Teasers {
  /** Luminosity distance of z = 1.678 under Planck 2018. */
  luminosityMpc: number
  /** Dark hours of the example target in the call's season above airmass 1.8. */
  visibleHours: number
}

/** The lensed quasar of the landing's examples: position and redshift as published. */
export const exampleTarget = { id: 'HE 0047−1756', raDeg: 12.61596, decDeg: -17.66911, redshift: 1.678 }

const kept = new Map<string, Teasers>()

/** Live numbers for the landing, computed by the engines and kept while the season is the same. */
export function readTeasers(view: CallView): Teasers {
  const key = [view.site.siteId, view.site.recordVersion, view.call.seasonFrom, view.call.seasonTo].join(' ')
  const known = kept.get(key)
  if (known) return known
  const { targets } = visibility({
    site: view.site,
    targets: [exampleTarget],
    from: view.call.seasonFrom,
    to: view.call.seasonTo,
    maxAirmass: 1.8,
    ...pointingOf(view.site),
  })
  const teasers = {
    luminosityMpc: presetCosmology('planck-2018').luminosityMpc(exampleTarget.redshift),
    visibleHours: targets[0]?.totalHours ?? 0,
  }
  kept.clear()
  kept.set(key, teasers)
  return teasers
}
