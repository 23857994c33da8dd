import type { ScienceNight } from '@/db/queries/scienceNights'
import type { NightBin } from '@/lib/panel/nights/binTypes'
import { moonClassLimits } from '@/lib/science/feasibility'
import { nightPieces } from '@/lib/science/sky'
import type { SiteRecord } from '../facility/types'
import { seasonAlmanac } from '../observations/seasonVisibility'
import { halfOf } from './halfOf'

const classes = ['dark', 'grey', 'bright'] as const

/** A stretch of dark time on one telescope, and the bin it counts to. Moments in milliseconds. */
export interface BinPiece {
  bin: number
  date: string
  from: number
  to: number
}

export interface SeasonBins {
  bins: (NightBin & { instrument: number | null })[]
  pieces: BinPiece[]
}

/** The dark time on offer, cut into bins: telescope, half-month, two hours of sidereal time, class of moonlight. */
export function seasonBins(
  site: SiteRecord,
  season: { from: string; to: string },
  nights: readonly ScienceNight[],
): SeasonBins {
  const cut = nightPieces({
    site,
    nights,
    moonClasses: classes.flatMap((name) => moonClassLimits[name].maxIllumination ?? []),
    almanac: seasonAlmanac(season.from, season.to),
  })
  const bins: SeasonBins['bins'] = []
  const known = new Map<string, number>()
  const pieces = cut.flatMap((piece): BinPiece[] => {
    const night = nights[piece.night]
    if (!night) return []
    const half = halfOf(night.date) - halfOf(season.from)
    const { telescopeId: telescope, instrumentId: instrument } = night
    const moon = classes[piece.moonClass] ?? 'bright'
    const { siderealFromH } = piece
    const key = `${telescope} ${instrument ?? ''} ${half} ${siderealFromH} ${moon}`
    const bin =
      known.get(key) ?? bins.push({ telescope, instrument, half, siderealFromH, moon, seconds: 0 }) - 1
    known.set(key, bin)
    const [from, to] = [piece.from.getTime(), piece.to.getTime()]
    const into = bins[bin]
    if (into) into.seconds += (to - from) / 1000
    return [{ bin, date: night.date, from, to }]
  })
  for (const bin of bins) bin.seconds = Math.floor(bin.seconds)
  return { bins, pieces }
}
