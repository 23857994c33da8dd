import { moonPhases, seasonGrid, type MoonPhase, type SeasonGrid } from '@/lib/science/sky'
import type { SiteRecord } from '../facility/types'
import { boundedMap } from './boundedMap'
import { hoursByMonth } from './hoursByMonth'
import { seasonAlmanac, seasonVisibility, type SeasonConditions } from './seasonVisibility'
import { skyTargetOf } from './skyTargetOf'

export interface SeasonView {
  grid: SeasonGrid
  phases: MoonPhase[]
  /** Of the target, night by night: local hours counted from midnight before the evening. */
  windows: [number, number][][]
  transits: (number | null)[]
  byNight: number[]
  byMonth: { month: string; hours: number }[]
  totalHours: number
  /** The night with most hours; null when there is none. */
  best: { night: number; hours: number } | null
}

const grids = boundedMap<{ grid: SeasonGrid; phases: MoonPhase[] }>(8)
const hour = 3_600_000

/** Sun and Moon of a season as a chart wants them, kept for each site and season. */
export function seasonSky(site: SiteRecord, from: string, to: string) {
  return grids.getOr(
    JSON.stringify([site.latitudeDeg, site.longitudeDeg, site.elevationM, from, to]),
    () => ({
      grid: seasonGrid(site, from, to, site.utcOffsetHours, { almanac: seasonAlmanac(from, to) }),
      phases: moonPhases(new Date(`${from}T12:00:00Z`), new Date(`${to}T12:00:00Z`)),
    }),
  )
}

/** A season with the windows of one target in it; null while the target has no position. */
export function seasonView(
  site: SiteRecord,
  season: SeasonConditions,
  target: Parameters<typeof skyTargetOf>[0],
): SeasonView | null {
  const sky = skyTargetOf(target)
  if (!sky) return null
  const { byTarget } = seasonVisibility(site, season, [sky])
  const visible = byTarget.get(sky.id)
  if (!visible) return null
  const { grid, phases } = seasonSky(site, season.from, season.to)
  const midnights = grid.nights.map(
    ({ night }) => Date.parse(`${night.date}T00:00:00Z`) - site.utcOffsetHours * hour,
  )
  const localHour = (at: Date, night: number) => (at.getTime() - (midnights[night] ?? 0)) / hour
  const most = Math.max(0, ...visible.byNight)
  return {
    grid,
    phases,
    windows: visible.windows.map((pieces, night) =>
      pieces.map(([from, to]): [number, number] => [localHour(from, night), localHour(to, night)]),
    ),
    transits: visible.culminations.map((at, night) => {
      const top = localHour(at, night)
      const isSeen = visible.windows[night]?.some(([from, to]) => from <= at && at <= to) ?? false
      return isSeen ? top : null
    }),
    byNight: visible.byNight,
    byMonth: hoursByMonth(
      grid.nights.map(({ night }) => night.date),
      visible.byNight,
    ),
    totalHours: visible.totalHours,
    best: most > 0 ? { night: visible.byNight.indexOf(most), hours: most } : null,
  }
}
