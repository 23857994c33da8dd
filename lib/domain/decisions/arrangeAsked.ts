import type { BinnedLine, NightBin } from '@/lib/panel/nights/binTypes'
import { byRankInBins } from '@/lib/panel/nights/byRankInBins'
import { fillerLine } from '@/lib/panel/nights/fillerLine'
import { placeMusts } from '@/lib/panel/nights/placeMusts'
import type { Solve } from '@/lib/panel/solver/types'
import { solveInWorker } from '@/lib/services/solver/solveInWorker'
import type { NightChoice } from './choiceWords'

type Asked = readonly (readonly BinnedLine[])[]

export interface ArrangedAsked {
  /** In the order they take their turns: those that must be given time, the ranking, fillers. */
  inTurn: Asked
  /** By rank without the fillers, and these. */
  byRank: Asked
  fillers: Asked
  /** Those that must be given time and can be. */
  must: number[]
  /** Those that must be given time and cannot all be: a smallest such set. */
  conflict: number[]
}

const limits = { seconds: 10, relativeGap: 0.005 }

const proposalOf = (lines: readonly BinnedLine[]) => lines[0]?.proposal ?? 0

/** The asked lines, by rank, as the chair's choices let them have their turns; what may never have time is left out. */
export async function arrangeAsked(
  asked: Asked,
  choices: ReadonlyMap<number, { choice: NightChoice }>,
  season: { bins: readonly NightBin[]; standing: readonly BinnedLine[] },
  solve: Solve = solveInWorker,
): Promise<ArrangedAsked> {
  const chosen = (choice: NightChoice | undefined) =>
    asked.filter((lines) => choices.get(proposalOf(lines))?.choice === choice)
  const musts = chosen('must')
  const others = chosen(undefined)
  const fillers = chosen('filler').map((lines) => lines.map((line) => fillerLine(line, season.bins)))
  const byRank = asked.filter((lines) => musts.includes(lines) || others.includes(lines))
  if (musts.length === 0) return { inTurn: [...byRank, ...fillers], byRank, fillers, must: [], conflict: [] }
  const found = await placeMusts(musts, { ...season, solve, limits })
  if ('placed' in found)
    return {
      inTurn: [...found.placed, ...others, ...fillers],
      ...{ byRank, fillers },
      must: musts.map(proposalOf),
      conflict: [],
    }
  // As many as fit by rank; the page says which stand in each other's way.
  const { given } = byRankInBins(musts, season.bins, season.standing)
  return {
    inTurn: [...musts, ...others, ...fillers],
    ...{ byRank, fillers },
    must: [...new Set(given.map(({ proposal }) => proposal))],
    conflict: 'conflict' in found ? found.conflict : musts.map(proposalOf),
  }
}
