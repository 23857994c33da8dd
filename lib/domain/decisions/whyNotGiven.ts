import { whyNotInBins } from '@/lib/panel/nights/whyNotInBins'
import type { NightsLine } from './nightsView'
import type { PlannedNights } from './planNights'

/** Why the suggestion gives a line nothing, and what giving it would take from others; null where it gives. */
export function whyNotGiven(
  planned: PlannedNights,
  proposalId: number,
  instrumentId: number,
  numberOf: (proposalId: number) => string,
): NightsLine['whyNot'] {
  if (planned.setAside.has(proposalId)) return { reason: 'set-aside', left: 0, displaces: [], nights: null }
  if (planned.terms.choices.get(proposalId)?.choice === 'never')
    return { reason: 'never', left: 0, displaces: [], nights: null }
  const not = planned.plan.notGiven.find(
    (one) => one.proposal === proposalId && one.instrument === instrumentId,
  )
  if (!not) return null
  const { reason, found: left } = not
  if (reason !== 'too-little-left') return { reason, left, displaces: [], nights: null }
  const { asked, bins, standing } = planned
  const lost = new Map<number, number>()
  for (const one of whyNotInBins(asked.inTurn, bins, standing, proposalId)?.displaced ?? [])
    lost.set(one.proposal, (lost.get(one.proposal) ?? 0) + one.fromSeconds - one.toSeconds)
  const displaces = [...lost].flatMap(([id, seconds]) =>
    seconds > 0 ? [{ reviewNumber: numberOf(id), seconds }] : [],
  )
  return { reason, left, displaces, nights: null }
}
