import type { CallPhase } from '../calls/types'
import { whyNotRanked } from '../panels/stages'
import { countInWords } from '@/lib/format'

export interface TableFacts {
  phase: CallPhase
  hasRanking: boolean
  reviewNumber: string
  isSetAside: boolean
  quorum: number
  /** Members at the meeting who have no interest in the proposal. */
  voices: number
}

/** Why a proposal cannot be put on the table, in a sentence; null when it can. */
export function whyNotOnTable(facts: TableFacts): string | null {
  const { phase, hasRanking, reviewNumber, isSetAside, quorum, voices } = facts
  const early = whyNotRanked(phase, hasRanking)
  if (early) return early
  if (isSetAside) return `${reviewNumber} is set aside. Bring it back first.`
  if (voices >= quorum) return null
  const here = voices === 0 ? 'nobody is here' : countInWords(voices, 'is here', 'are here')
  return `${countInWords(quorum, 'member is', 'members are', true)} needed to discuss ${reviewNumber}, and ${here} without an interest in it.`
}

/** Why a reader cannot score again now; null when they can: only what is on the table, and only a finished review. */
export function whyNotScoredAgain(isOnTable: boolean, isFinished: boolean): string | null {
  if (!isOnTable) return 'Scores are given again only while the proposal is discussed.'
  return isFinished ? null : 'Your review was not finished before the panel met: it does not count.'
}

/** The mean after discussion: each reader’s later score where there is one, else the first. Null where there is neither. */
export function meanAfter(scores: readonly { before: number | null; after: number | null }[]): number | null {
  const standing = scores.flatMap(({ before, after }) => after ?? before ?? [])
  return standing.length === 0 ? null : standing.reduce((sum, score) => sum + score, 0) / standing.length
}
