import { brent } from '../numeric/brent'

/** A stretch of time, days since J2000, from < to. */
export type Interval = readonly [from: number, to: number]

/** A tenth of a second, in days. */
const TOLERANCE = 0.1 / 86_400

/** What two ordered lists of intervals have in common. */
export function intersect(a: readonly Interval[], b: readonly Interval[]): Interval[] {
  const common: Interval[] = []
  for (const [from, to] of a) {
    for (const [start, end] of b) {
      const low = Math.max(from, start)
      const high = Math.min(to, end)
      if (high > low) common.push([low, high])
    }
  }
  return common
}

/** What is left of the first list without the second. */
export function without(a: readonly Interval[], b: readonly Interval[]): Interval[] {
  let left: Interval[] = [...a]
  for (const [start, end] of b) {
    left = left.flatMap(([from, to]): Interval[] => {
      if (end <= from || start >= to) return [[from, to]]
      const parts: Interval[] = []
      if (start > from) parts.push([from, start])
      if (end < to) parts.push([end, to])
      return parts
    })
  }
  return left
}

/**
 * Where f > 0 on an ordered list of times; each edge between two of them is found to a tenth of a second.
 * `values` are f at the times, when they are known already.
 */
export function intervalsAbove(
  f: (days: number) => number,
  times: readonly number[],
  values: readonly number[] = times.map(f),
): Interval[] {
  const found: Interval[] = []
  let start: number | null = null
  let previousTime = times[0] ?? 0
  let previousValue = values[0] ?? 0
  if (previousValue > 0) start = previousTime
  for (const [i, time] of times.entries()) {
    const value = values[i] ?? 0
    if (i > 0 && value > 0 !== previousValue > 0) {
      const edge = brent(f, previousTime, time, TOLERANCE)
      if (value > 0) start = edge
      else if (start !== null) {
        if (edge > start) found.push([start, edge])
        start = null
      }
    }
    previousTime = time
    previousValue = value
  }
  if (start !== null && previousTime > start) found.push([start, previousTime])
  return found
}

export function totalDays(intervals: readonly Interval[]): number {
  return intervals.reduce((sum, [from, to]) => sum + (to - from), 0)
}
