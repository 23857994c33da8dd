import { moonPhases, seasonGrid } from '@/lib/science/sky'
import type { SiteRecord } from '../facility/types'
import type { Season } from './types'

const kept = new Map<string, Season>()
const most = 24

/** Sun and Moon over a season at a site; the same for every reader, so computed once a process. */
export function readSeason(site: SiteRecord, from: string, to: string): Season {
  const key = [site.siteId, site.recordVersion, from, to].join(' ')
  const known = kept.get(key)
  if (known) return known
  const grid = seasonGrid(site, from, to, site.utcOffsetHours)
  const season = {
    grid,
    phases: moonPhases(
      new Date(`${from}T00:00:00Z`),
      new Date(Date.parse(`${to}T00:00:00Z`) + 2 * 86_400_000),
    ),
    darkHours: grid.nights.reduce((sum, night) => sum + night.night.darkHours, 0),
  }
  if (kept.size >= most) kept.delete(kept.keys().next().value ?? '')
  kept.set(key, season)
  return season
}
