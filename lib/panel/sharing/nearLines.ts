import type { MergedEntry } from './types'

/** A proposal that uses its panel's share up to here stands near the panel's line. */
export const nearFrom = 0.75
export const nearTo = 1.25

/**
 * Which places of a merged order stand near the panels' lines, where a meeting may put them in another order: from the
 * first to the last proposal that uses 0.75 to 1.25 of its panel's share, or stands right above or below its panel's
 * line. A panel's line is drawn where its share ends.
 */
export function nearLines(merged: readonly MergedEntry[]): boolean[] {
  const isAtLine = (entry: MergedEntry) => {
    const own = merged.filter(({ panel }) => panel === entry.panel)
    const within = own.filter(({ used }) => used <= 1).length
    if (within === 0 || within === own.length) return false
    return entry.rank === own[within - 1]?.rank || entry.rank === own[within]?.rank
  }
  const near = merged.map((entry) => (entry.used >= nearFrom && entry.used <= nearTo) || isAtLine(entry))
  const first = near.indexOf(true)
  const last = near.lastIndexOf(true)
  return merged.map((_, index) => first !== -1 && index >= first && index <= last)
}
