import type { SeasonBins } from '../nights/seasonBins'
import type { NightHalf } from './types'

/** First and last dark moment of each evening of a season, milliseconds. */
export type DarkSpans = ReadonlyMap<string, readonly [from: number, to: number]>

/** Edges are good to a tenth of a second; a part of the calendar that falls short by more than this is another's. */
const slackMs = 2000

/** How much of a stretch lies within others that do not overlap. */
export const overlapMs = (
  [from, to]: readonly [number, number],
  others: readonly (readonly [number, number])[],
): number =>
  others.reduce((sum, [start, end]) => sum + Math.max(0, Math.min(to, end) - Math.max(from, start)), 0)

/** The two halves of a night's dark time. */
export function halvesOf([from, to]: readonly [number, number]): readonly (readonly [number, number])[] {
  const middle = Math.round((from + to) / 2)
  return [
    [from, middle],
    [middle, to],
  ]
}

/**
 * The halves of nights that are whole for science with an instrument on its telescope: none of it engineering, promised,
 * bound to another instrument or given already.
 */
export function nightHalves(
  { bins, pieces }: SeasonBins,
  dark: DarkSpans,
  { telescope, instrument }: { telescope: number; instrument: number },
): NightHalf[] {
  const open = new Map<string, [number, number][]>()
  for (const { bin, date, from, to } of pieces) {
    const own = bins[bin]
    if (own?.telescope !== telescope || (own.instrument !== null && own.instrument !== instrument)) continue
    open.set(date, [...(open.get(date) ?? []), [from, to]])
  }
  return [...open].flatMap(([date, stretches]) => {
    const span = dark.get(date)
    if (!span) return []
    return halvesOf(span).flatMap(([from, to], at): NightHalf[] => {
      const openMs = overlapMs([from, to], stretches)
      if (openMs < to - from - slackMs) return []
      const half = at === 0 ? 'first' : 'second'
      return [{ telescope, date, half, from, to, seconds: Math.floor(openMs / 1000) }]
    })
  })
}
