import type { SiteWeather } from '../facility/types'
import { halfOf } from './halfOf'

export interface SeasonWeather {
  /** Chance that a night is lost, for every evening from the first to the last. */
  lost: number[]
  /** The same for each half-month, counted from that of the first evening. */
  lostByHalf: number[]
  persistence: number
}

const dayMs = 86_400_000

/**
 * How often the nights of a season are lost. `evenShare`, from 0 to 1, takes the place of the record's months; nights
 * keep their likeness. Nothing is lost where nothing is on record.
 */
export function seasonWeather(
  weather: SiteWeather | null,
  season: { from: string; to: string },
  evenShare: number | null = null,
): SeasonWeather {
  const inMonth = (month: number) => evenShare ?? weather?.lostByMonth[month] ?? 0
  const [first, last] = [Date.parse(season.from), Date.parse(season.to)]
  const lost: number[] = []
  const lostByHalf: number[] = []
  for (let at = first; at <= last; at += dayMs) {
    const evening = new Date(at)
    const chance = inMonth(evening.getUTCMonth())
    lost.push(chance)
    lostByHalf[halfOf(evening.toISOString()) - halfOf(season.from)] = chance
  }
  return { lost, lostByHalf, persistence: weather?.persistence ?? 0 }
}
