import type { SeasonAward } from '@/lib/panel/nights/seasonTypes'
import type { DatedVisit } from './types'

const dayMs = 86_400_000

/**
 * Visits as they are run through seasons of weather: each half of a night is a piece of its own that nobody else can use,
 * so that a night that is lost is made good by no other.
 */
export function visitsToRun(
  visits: readonly DatedVisit[],
  { seasonFrom, firstBin }: { seasonFrom: string; firstBin: number },
): { pieces: [night: number, bin: number, seconds: number][]; awards: SeasonAward[] } {
  const pieces: [number, number, number][] = []
  const awards = visits.map(({ proposal, instrument, seconds, halves }): SeasonAward => {
    const bins = halves.map(({ date, seconds: own }) => {
      const night = Math.round((Date.parse(date) - Date.parse(seasonFrom)) / dayMs)
      const bin = firstBin + pieces.length
      pieces.push([night, bin, own])
      return { bin, own }
    })
    const laid = new Map(bins.map(({ bin, own }) => [bin, own]))
    const share = new Map(bins.map(({ bin }) => [bin, 1]))
    return { proposal, instrument, parts: [{ seconds, laid, share }] }
  })
  return { pieces, awards }
}
