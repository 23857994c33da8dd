import type { Solve, SolveLimits } from '../solver/types'
import type { BinnedLine, NightBin } from './binTypes'
import { byRankInBins } from './byRankInBins'
import { NightsProgramme } from './nightsProgramme'
import { solvedLine } from './solvedLine'

type Musts = readonly (readonly BinnedLine[])[]

/** The lines of proposals that must be given time, first in turn; or those of them that cannot all be. */
export type PlacedMusts =
  | { placed: Musts }
  /** No fewer: any one of them left out, the others fit. */
  | { conflict: number[] }
  /** Why the solver has no answer. */
  | { why: string }

interface Season {
  bins: readonly NightBin[]
  /** Given elsewhere, laid first. */
  standing: readonly BinnedLine[]
  solve: Solve
  limits: SolveLimits
}

const proposalOf = (lines: readonly BinnedLine[] | undefined) => lines?.[0]?.proposal ?? 0

/** All of them with their least at least, as much as can be in ranking order; null where they do not fit. */
async function fit(musts: Musts, season: Season): Promise<{ placed: Musts } | { why: string } | null> {
  const { bins, standing, solve, limits } = season
  if (musts.some((lines) => lines.some(({ possible }) => !possible))) return null
  const given = new Set(byRankInBins(musts, bins, standing).given.map(({ proposal }) => proposal))
  // In turn each may take its whole; only where that leaves another short must they share.
  if (musts.every((lines) => given.has(proposalOf(lines)))) return { placed: musts }
  const programme = new NightsProgramme(bins, standing)
  const placed = musts.map((lines, at) => programme.choose(lines, musts.length - at, { isForced: true }))
  const answer = await solve(programme.build(), limits)
  if (!answer.values) return answer.status === 'infeasible' ? null : { why: answer.why }
  const { values } = answer
  const solved = placed.map((lines) => lines.flatMap((line) => solvedLine(line, values) ?? []))
  return solved.every((lines, at) => lines.length === musts[at]?.length) ? { placed: solved } : null
}

/**
 * Time for every proposal that must be given some: the higher ones their whole where they can have it, each its least
 * useful award at least. Exact. Where they do not all fit, a smallest set that does not: from the lowest rank up, each
 * is left out for good if the others still do not fit without it.
 */
export async function placeMusts(musts: Musts, season: Season): Promise<PlacedMusts> {
  const whole = await fit(musts, season)
  if (whole) return whole
  let left = musts
  for (const lines of [...musts].reverse()) {
    const without = left.filter((one) => one !== lines)
    if (without.length > 0 && (await fit(without, season)) === null) left = without
  }
  return { conflict: left.map(proposalOf) }
}
