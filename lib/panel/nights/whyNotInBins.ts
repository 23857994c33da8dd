import { byRankInBins } from './byRankInBins'
import type { BinnedGiven, BinnedLine, NightBin } from './binTypes'

export interface Displaced {
  proposal: number
  instrument: number
  /** Seconds without and with the proposal put first. */
  fromSeconds: number
  toSeconds: number
}

/**
 * What giving a proposal its hours would cost: the nights are divided again with it in first place. Null where even
 * then nothing can be given. Seconds that others lose, in ranking order; some may gain.
 */
export function whyNotInBins(
  asked: readonly (readonly BinnedLine[])[],
  bins: readonly NightBin[],
  standing: readonly BinnedLine[],
  proposal: number,
): { seconds: number; displaced: Displaced[] } | null {
  const own = asked.find((lines) => lines[0]?.proposal === proposal)
  if (!own) return null
  const before = byRankInBins(asked, bins, standing).given
  const after = byRankInBins([own, ...asked.filter((lines) => lines !== own)], bins, standing).given
  const secondsIn = (plan: readonly BinnedGiven[], line: BinnedLine): number =>
    plan.find((one) => one.proposal === line.proposal && one.instrument === line.instrument)?.seconds ?? 0
  const seconds = own.reduce((sum, line) => sum + secondsIn(after, line), 0)
  if (seconds === 0) return null
  const displaced = asked
    .filter((lines) => lines !== own)
    .flat()
    .map((line) => ({
      proposal: line.proposal,
      instrument: line.instrument,
      fromSeconds: secondsIn(before, line),
      toSeconds: secondsIn(after, line),
    }))
    .filter(({ fromSeconds, toSeconds }) => fromSeconds !== toSeconds)
  return { seconds, displaced }
}
