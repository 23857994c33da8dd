import type { Site, SkyTarget } from '../../../lib/science/sky'
import { fixture } from './fixture'

interface Edge {
  at: string
  rising: boolean
}

interface TwilightEdges {
  evening: string | null
  morning: string | null
}

export interface SkyFixture {
  source: string
  maxAirmass: number
  lowestAltitudeDeg: number
  sites: Record<string, Site>
  targets: SkyTarget[]
  positions: {
    site: string
    at: string
    sunAltitudeDeg: number
    moonAltitudeDeg: number
    moonIllumination: number
    lastHours: number
    targets: {
      id: string
      altitudeDeg: number
      azimuthDeg: number
      moonSeparationDeg: number
      sunSeparationDeg: number
    }[]
  }[]
  nights: {
    site: string
    date: string
    sunset: TwilightEdges
    civil: TwilightEdges
    nautical: TwilightEdges
    astronomical: TwilightEdges
    moonEdges: Edge[]
    moonIllumination: number
  }[]
  windows: { site: string; date: string; id: string; edges: Edge[] }[]
}

export const sky = fixture<SkyFixture>('sky')

/** A place of the fixture by name. */
export function place(name: string): Site {
  const site = sky.sites[name]
  if (!site) throw new Error(`No site called ${name}`)
  return site
}
