import { formatHoursFromSeconds } from '@/lib/format'
import { observationsOn } from '../assessments/rules'
import type { ProposalContents } from '../proposals/types'
import { visitInWords } from './visitWords'

export interface WishLine {
  instrument: string
  /** `three nights in a row`; null in the queue. */
  visit: string | null
  /** `5.4 h`; null where half of what is asked is meant. */
  least: string | null
}

/** What is wished for on each instrument that is asked for; nothing of those of which nothing is said. */
export function wishLines({
  wishes,
  modes,
  observations,
}: Pick<ProposalContents, 'wishes' | 'modes' | 'observations'>): WishLine[] {
  return wishes.flatMap(({ instrumentId, visit, leastSeconds }) => {
    const name = modes.find(({ instrument }) => instrument.id === instrumentId)?.instrument.name
    const isSaid = visit !== null || leastSeconds !== null
    if (!name || !isSaid || observationsOn(observations, modes, instrumentId).length === 0) return []
    return [
      {
        instrument: name,
        visit: visit ? visitInWords(visit) : null,
        least: leastSeconds === null ? null : formatHoursFromSeconds(leastSeconds),
      },
    ]
  })
}
