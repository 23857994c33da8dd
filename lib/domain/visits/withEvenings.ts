import type { StandingAward } from '@/db/queries/decisions'
import type { StandingHalf } from '@/db/queries/visits'
import { eveningsInWords } from './eveningsInWords'

/** Award lines with the nights of their visits in words; an empty text in the queue. */
export function withEvenings(
  lines: readonly StandingAward[],
  halves: readonly StandingHalf[],
): (StandingAward & { evenings: string })[] {
  return lines.map((line) => {
    const own = halves.filter(
      ({ proposalId, instrumentId }) => proposalId === line.proposalId && instrumentId === line.instrumentId,
    )
    return { ...line, evenings: line.service === 'visitor' ? eveningsInWords(own) : '' }
  })
}
