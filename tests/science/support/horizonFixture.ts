import type { HorizonProfile, Site, SkyTarget } from '../../../lib/science/sky'
import { fixture } from './fixture'

export interface HorizonFixture {
  source: string
  lowestAltitudeDeg: number
  highestAltitudeDeg: number
  sites: Record<string, Site>
  horizons: Record<string, HorizonProfile>
  targets: SkyTarget[]
  /** Usable windows, ISO 8601 UTC. */
  windows: { site: string; date: string; horizon: string; id: string; windows: [string, string][] }[]
}

export const horizons = fixture<HorizonFixture>('horizon')
