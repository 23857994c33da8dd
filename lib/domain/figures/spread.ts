import type { BinnedLine, NightBin } from '@/lib/panel/nights/binTypes'

export interface SpreadTime {
  /** Seconds asked in each bin. */
  asked: number[]
  /** Seconds of parts that no bin serves. */
  unserved: number
}

/**
 * Lays the time asked over the bins it could be observed in, each part in proportion to the time that serves it there:
 * where pressure would lie if every hour were as good as another. Nothing is held against what is on offer.
 */
export function spreadOverBins(lines: readonly BinnedLine[], bins: readonly NightBin[]): SpreadTime {
  const asked = bins.map(() => 0)
  let unserved = 0
  for (const { seconds, usable } of lines.flatMap(({ parts }) => parts)) {
    const whole = [...usable.values()].reduce((sum, one) => sum + one, 0)
    if (whole === 0) unserved += seconds
    else for (const [bin, share] of usable) asked[bin] = (asked[bin] ?? 0) + (seconds * share) / whole
  }
  return { asked, unserved }
}
