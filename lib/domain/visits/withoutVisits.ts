import type { SeasonBins } from '../nights/seasonBins'
import type { NightHalf } from './types'

/** A season less what visits have of it: nobody else is laid there, so that nothing is promised twice. */
export function withoutVisits<S extends SeasonBins>(season: S, halves: readonly NightHalf[]): S {
  if (halves.length === 0) return season
  const pieces = season.pieces.flatMap((piece) => {
    const telescope = season.bins[piece.bin]?.telescope
    const own = halves.filter((half) => half.telescope === telescope && half.date === piece.date)
    let left = [piece]
    for (const { from, to } of own)
      left = left.flatMap((part) => {
        if (to <= part.from || from >= part.to) return [part]
        return [
          ...(from > part.from ? [{ ...part, to: from }] : []),
          ...(to < part.to ? [{ ...part, from: to }] : []),
        ]
      })
    return left
  })
  const seconds = season.bins.map(() => 0)
  for (const { bin, from, to } of pieces) seconds[bin] = (seconds[bin] ?? 0) + (to - from) / 1000
  return {
    ...season,
    pieces,
    bins: season.bins.map((bin, at) => ({ ...bin, seconds: Math.floor(seconds[at] ?? 0) })),
  }
}
