import type { Solve, SolveLimits } from '../solver/types'
import type { BinnedLine, BinnedPlan, NightBin } from './binTypes'
import { byRankInBins } from './byRankInBins'
import { hour, NightsProgramme } from './nightsProgramme'
import { solvedLine } from './solvedLine'

export interface MeritInput {
  /** In ranking order. */
  asked: readonly (readonly BinnedLine[])[]
  /** How many of them stand above the line. */
  line: number
  bins: readonly NightBin[]
  /** Given elsewhere, laid first. */
  standing: readonly BinnedLine[]
  /** Merit of a proposal, above 0. */
  merit: ReadonlyMap<number, number>
  /** Proposals that get their least at least, wherever they stand. */
  must?: readonly number[]
}

export interface MeritPlan extends BinnedPlan {
  /** Merit times hours above the line, as found, and what no plan can exceed. */
  meritHours: number
  boundMeritHours: number
}

/**
 * Most merit above the line: awards, whole or in part, with the greatest sum of merit times hours among the proposals
 * above the line; then the others fill what remains, by rank. A mixed-integer programme; a sentence where the
 * solver has no answer.
 */
export async function mostMeritInBins(
  input: MeritInput,
  solve: Solve,
  limits: SolveLimits,
): Promise<MeritPlan | { why: string }> {
  const { asked, line, bins, standing, merit } = input
  const must = new Set(input.must)
  const isAbove = new Set(asked.slice(0, line).map((lines) => lines[0]?.proposal))
  const chosenAmong = asked.filter(
    (lines) =>
      lines.every(({ possible }) => possible) &&
      (isAbove.has(lines[0]?.proposal) || must.has(lines[0]?.proposal ?? 0)),
  )
  // A solver has no answer to a programme of nothing.
  if (chosenAmong.length === 0)
    return { ...byRankInBins(asked, bins, standing), meritHours: 0, boundMeritHours: 0 }
  // Merit falls with rank: whom the ranking gives time is close to the best already.
  const begun = new Set(byRankInBins(asked, bins, standing).given.map(({ proposal }) => proposal))
  const programme = new NightsProgramme(bins, standing)
  const placed = chosenAmong.map((lines) => {
    const proposal = lines[0]?.proposal ?? 0
    return programme.choose(lines, isAbove.has(proposal) ? (merit.get(proposal) ?? 0) : 0, {
      isForced: must.has(proposal),
      isBegun: begun.has(proposal),
    })
  })
  const answer = await solve(programme.build(), limits)
  if (answer.values === null) return { why: answer.why }
  const { values } = answer
  const chosen = placed.flatMap((lines) => {
    const solved = lines.map((one) => solvedLine(one, values))
    return solved.every((one) => one !== null) ? [solved as BinnedLine[]] : []
  })
  const isChosen = new Set(chosen.map((lines) => lines[0]?.proposal))
  const rest = asked.filter((lines) => !isChosen.has(lines[0]?.proposal))
  const plan = byRankInBins([...chosen, ...rest], bins, standing)
  const meritHours = plan.given
    .filter(({ proposal }) => isAbove.has(proposal))
    .reduce((sum, { proposal, seconds }) => sum + ((merit.get(proposal) ?? 0) * seconds) / hour, 0)
  return { ...plan, meritHours, boundMeritHours: Math.max(meritHours, answer.bound) }
}
