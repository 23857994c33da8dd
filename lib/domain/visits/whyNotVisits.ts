import type { Solve } from '@/lib/panel/solver/types'
import { whyNotVisit } from '@/lib/panel/nights/visits/whyNotVisit'
import { solveInWorker } from '@/lib/services/solver/solveInWorker'
import type { NightsLine } from '../decisions/nightsView'
import type { PlannedNights } from '../decisions/planNights'
import { visitLimits } from './planVisits'
import { isVisit } from './visitLines'

type WhyNot = NonNullable<NightsLine['whyNot']>

export const visitKey = (proposalId: number, instrumentId: number): string => `${proposalId} ${instrumentId}`

/** Why the suggestion gives visits no nights, and which other visits giving them would cost; by proposal and instrument. */
export async function whyNotVisits(
  planned: PlannedNights,
  numberOf: (proposalId: number) => string,
  solve: Solve = solveInWorker,
): Promise<Map<string, WhyNot>> {
  const { wanted, visits, terms, order, line, setAside } = planned
  const found = new Map<string, WhyNot>()
  for (const want of wanted) {
    const { proposalId, instrumentId: instrument } = want
    const choice = terms.choices.get(proposalId)?.choice
    if (!isVisit(want, terms.choices) || setAside.has(proposalId) || choice === 'never') continue
    const key = visitKey(proposalId, instrument)
    const why = (reason: WhyNot['reason'], more: Partial<WhyNot> = {}) =>
      found.set(key, { reason, left: 0, displaces: [], nights: null, ...more })
    if (!want.possible) {
      why('not-possible')
      continue
    }
    if (choice !== 'must' && order.indexOf(proposalId) >= line) {
      why('below-line')
      continue
    }
    const not = visits.notPlaced.find((one) => one.proposal === proposalId && one.instrument === instrument)
    if (!not) continue
    const least = visits.asked.find(
      (one) => one.proposal === proposalId && one.instrument === instrument,
    )?.least
    const nights = { most: not.most, least: least ?? 0 }
    if (not.reason === 'no-nights') {
      why('no-nights', { nights })
      continue
    }
    const lost = await whyNotVisit(
      visits.asked,
      visits.placed,
      { proposal: proposalId, instrument },
      { solve, limits: visitLimits },
    )
    const displaces = lost.map(({ proposal, fromSeconds, toSeconds }) => ({
      reviewNumber: numberOf(proposal),
      seconds: fromSeconds - toSeconds,
    }))
    why('nights-taken', { nights, displaces })
  }
  return found
}
