import { standingAwards } from '@/db/queries/decisions'
import { formatHoursFromSeconds } from '@/lib/format'
import type { ActingContext } from '../context'
import type { PlannedNights } from './planNights'
import type { ChoiceOrRank } from './choiceWords'
import { conflictInWords } from './mustWords'

/** Why a choice cannot be laid down as things stand; null where it can. `planned` is the division with it in force. */
export async function whyNotChosen(
  tx: ActingContext,
  planned: PlannedNights,
  { id, reviewNumber }: { id: number; reviewNumber: string },
  choice: ChoiceOrRank,
  numberOf: (proposalId: number) => string,
): Promise<string | null> {
  if (choice === 'never') {
    const given = (await standingAwards(tx.db, [id])).reduce((sum, { seconds }) => sum + seconds, 0)
    return given > 0
      ? `${reviewNumber} is given ${formatHoursFromSeconds(given)}. Take these hours back first.`
      : null
  }
  if (choice === 'rank') return null
  if (planned.setAside.has(id)) return `${reviewNumber} is set aside. Bring it back to the list first.`
  if (choice !== 'must') return null
  const impossible = planned.wanted.find((line) => line.proposalId === id && !line.possible)
  if (impossible) return `${impossible.instrument} was assessed as not possible for ${reviewNumber}.`
  if (planned.visits.notPlaced.some(({ proposal }) => proposal === id))
    return `${reviewNumber} must be given time, but its visit finds no nights that suit it and that nobody before it has.`
  const { conflict } = planned.asked
  return conflict.length > 0 ? conflictInWords(conflict.map(numberOf)) : null
}
