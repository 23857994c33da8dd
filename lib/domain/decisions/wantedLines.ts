import { standingLeasts } from '@/db/queries/nightTerms'
import { assessedLines, requestLines } from '@/db/queries/panel'
import { sentWishes } from '@/db/queries/wishes'
import type { Database } from '@/db/client'
import { leastUseful } from '@/lib/panel/nights/leastUseful'
import type { VisitWish } from '../proposals/types'

/** Who says what is least of use; half of the whole where nobody does. */
export type LeastBy = 'chair' | 'investigators' | 'half'

export interface WantedLine {
  proposalId: number
  instrumentId: number
  instrument: string
  telescopeId: number
  telescope: string
  askedSeconds: number
  /** What it truly takes, where assessed; else as asked. */
  wholeSeconds: number
  leastSeconds: number
  /** Whose least it is, and why where the chair set it. */
  leastBy: LeastBy
  leastReason: string
  /** The nights of a visit it wishes for; null for the queue. */
  visit: VisitWish | null
  possible: boolean
  assessment: { verdict: 'accepted' | 'change' | 'not-possible'; reason: string } | null
}

/** What each proposal wants of each instrument: as asked, with the assessment standing above it. */
export async function wantedLines(db: Database, proposalIds: readonly number[]): Promise<WantedLine[]> {
  const [asked, assessed, wishes, leasts] = await Promise.all([
    requestLines(db, proposalIds),
    assessedLines(db, proposalIds),
    sentWishes(db, proposalIds),
    standingLeasts(db, proposalIds),
  ])
  return asked.map((line) => {
    const isOwn = (one: { proposalId: number; instrumentId: number }) =>
      one.proposalId === line.proposalId && one.instrumentId === line.instrumentId
    const found = assessed.find(isOwn)
    const wish = wishes.find(isOwn)
    const set = leasts.find(isOwn)
    const wholeSeconds = found && found.verdict === 'change' ? found.trueSeconds : line.askedSeconds
    return {
      ...line,
      wholeSeconds,
      ...leastOf(wholeSeconds, wish?.leastSeconds ?? null, set ?? null),
      visit: wish?.visit ?? null,
      possible: found?.verdict !== 'not-possible',
      assessment: found ? { verdict: found.verdict, reason: found.reason } : null,
    }
  })
}

/** The chair's least above the investigators', and theirs above half; never more than the whole. */
function leastOf(
  wholeSeconds: number,
  wished: number | null,
  set: { seconds: number; reason: string } | null,
): Pick<WantedLine, 'leastSeconds' | 'leastBy' | 'leastReason'> {
  const within = (seconds: number) => Math.min(seconds, wholeSeconds)
  if (set) return { leastSeconds: within(set.seconds), leastBy: 'chair', leastReason: set.reason }
  if (wished !== null) return { leastSeconds: within(wished), leastBy: 'investigators', leastReason: '' }
  return { leastSeconds: leastUseful(wholeSeconds), leastBy: 'half', leastReason: '' }
}
