/** Repeatable numbers (mulberry32): the same seed tells the same story. */
export interface Dice {
  /** Even between 0 and 1. */
  next(): number
  between(low: number, high: number): number
  /** Normal deviate (Box and Muller). */
  normal(mean: number, sigma: number): number
  pick<T>(from: readonly T[]): T
}

export function dice(seed: number): Dice {
  let state = seed >>> 0
  const next = () => {
    state = (state + 0x6d2b79f5) >>> 0
    let t = state
    t = Math.imul(t ^ (t >>> 15), t | 1)
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61)
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296
  }
  const between = (low: number, high: number) => low + (high - low) * next()
  return {
    next,
    between,
    normal: (mean, sigma) =>
      mean + sigma * Math.sqrt(-2 * Math.log(1 - next())) * Math.cos(2 * Math.PI * next()),
    pick: (from) => {
      const one = from[Math.floor(next() * from.length)]
      if (one === undefined) throw new Error('nothing to pick from')
      return one
    },
  }
}
