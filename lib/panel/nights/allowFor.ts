import type { BinnedLine, NightBin } from './binTypes'

export interface Allowance {
  /** Share of the nights lost to weather, by half-month of the season; none where not given. */
  lostByHalf: readonly number[]
  /** Telescope to the share of its time that is held back. */
  heldShare: ReadonlyMap<number, number>
}

/** Share of each bin that may be planned with: what the weather leaves of what is not held back. */
export function keptShares(bins: readonly NightBin[], { lostByHalf, heldShare }: Allowance): number[] {
  const within = (share: number) => Math.min(1, Math.max(0, share))
  return bins.map(
    ({ half, telescope }) =>
      (1 - within(lostByHalf[half] ?? 0)) * (1 - within(heldShare.get(telescope) ?? 0)),
  )
}

/** The bins with what may be planned of them, whole seconds. */
export function keptBins(bins: readonly NightBin[], kept: readonly number[]): NightBin[] {
  return bins.map((bin, at) => ({ ...bin, seconds: Math.floor(bin.seconds * (kept[at] ?? 1)) }))
}

/** A line of which each target finds the same share of its usable time: weather asks nobody's target. */
export function keptLine(line: BinnedLine, kept: readonly number[]): BinnedLine {
  const parts = line.parts.map(({ seconds, usable }) => ({
    seconds,
    usable: new Map(
      [...usable].flatMap(([bin, own]) => {
        const left = Math.floor(own * (kept[bin] ?? 1))
        return left > 0 ? [[bin, left] as const] : []
      }),
    ),
  }))
  return { ...line, parts }
}
