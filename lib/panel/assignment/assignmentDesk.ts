import type { AssignmentDesk } from './assignmentProgramme'
import { candidatePairs } from './candidatePairs'
import { demandOf } from './demandOf'
import type { OptimalInput } from './optimalTypes'

export interface OpenedDesk extends AssignmentDesk {
  meanPages: number
  tolerancePages: number
  /** Whether the pairs are few enough for the worst-served proposal to be settled in whole readers. */
  isSmall: boolean
  relativeGap: number
  /** Whether all candidates have one affinity. */
  areAlike: boolean
  /** What no assignment can exceed, loads or not: each proposal with its best readers. */
  bestWorst: number
  bestSum: number
}

const SMALL_PAIRS = 600

/** Demand, candidates and the range of loads, before any solving. */
export function assignmentDesk(input: OptimalInput): OpenedDesk {
  const { reviewers, standing, affinity } = input
  const demands = demandOf(input)
  const candidates = candidatePairs(demands, affinity)
  const pagesOf = new Map(input.proposals.map(({ id, pages }) => [id, pages]))
  const standingPages = new Map(reviewers.map((id) => [id, 0]))
  const standingAffinity = new Map<number, number>()
  for (const { proposal, reviewer } of standing) {
    const pages = pagesOf.get(proposal)
    if (pages === undefined) continue
    const held = standingPages.get(reviewer)
    if (held !== undefined) standingPages.set(reviewer, held + pages)
    standingAffinity.set(proposal, (standingAffinity.get(proposal) ?? 0) + affinity(proposal, reviewer))
  }
  const held = [...standingPages.values()].reduce((total, pages) => total + pages, 0)
  const added = demands.reduce((total, { wanted, proposal }) => total + wanted * proposal.pages, 0)
  const meanPages = (held + added) / Math.max(1, reviewers.length)
  const longest = Math.max(0, ...input.proposals.map(({ pages }) => pages))
  // Where all are as long, whole proposals cannot come nearer to the mean than one of them.
  const tolerancePages = input.tolerancePages ?? longest
  const best = demands.map(({ proposal, free, wanted, lacking }) => {
    const own = free.map((reviewer) => affinity(proposal.id, reviewer)).sort((a, b) => b - a)
    const gained = own.slice(0, wanted).reduce((total, one) => total + one, 0)
    return { lacking, total: gained + (standingAffinity.get(proposal.id) ?? 0) }
  })
  const areAlike = candidates.every((pair) => pair.affinity === candidates[0]?.affinity)
  const isSmall = candidates.length <= SMALL_PAIRS
  return {
    demands,
    candidates,
    reviewers,
    standingAffinity,
    standingPages,
    leastPages: Math.ceil(meanPages - tolerancePages),
    mostPages: Math.floor(meanPages + tolerancePages),
    tieWeight: areAlike ? 1e-3 : isSmall ? 1e-6 : 1e-4,
    // Ties alone are no reason to go on.
    relativeGap: isSmall ? 0 : areAlike ? 1e-3 : 1e-4,
    meanPages,
    tolerancePages,
    isSmall,
    areAlike,
    bestWorst: Math.min(...best.filter(({ lacking }) => lacking === 0).map(({ total }) => total)),
    bestSum: best.reduce((sum, { total }) => sum + total, 0),
  }
}
