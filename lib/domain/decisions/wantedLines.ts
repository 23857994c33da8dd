import { assessedLines, requestLines } from '@/db/queries/panel'
import type { Database } from '@/db/client'
import { leastUseful } from '@/lib/panel/nights/leastUseful'

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
  possible: boolean
  assessment: { verdict: 'accepted' | 'change' | 'not-possible'; reason: string } | null
}

/** What each proposal wants of each instrument: as asked, with the assessment standing above it. */
export async function wantedLines(db: Database, proposalIds: readonly number[]): Promise<WantedLine[]> {
  const [asked, assessed] = await Promise.all([requestLines(db, proposalIds), assessedLines(db, proposalIds)])
  return asked.map((line) => {
    const found = assessed.find(
      (one) => one.proposalId === line.proposalId && one.instrumentId === line.instrumentId,
    )
    const wholeSeconds = found && found.verdict === 'change' ? found.trueSeconds : line.askedSeconds
    return {
      ...line,
      wholeSeconds,
      leastSeconds: leastUseful(wholeSeconds),
      possible: found?.verdict !== 'not-possible',
      assessment: found ? { verdict: found.verdict, reason: found.reason } : null,
    }
  })
}
