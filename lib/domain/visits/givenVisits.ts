import { standingHalves, type StandingHalf } from '@/db/queries/visits'
import type { Database } from '@/db/client'
import { keptBins } from '@/lib/panel/nights/allowFor'
import type { NightBin } from '@/lib/panel/nights/binTypes'
import type { Call } from '../calls/types'
import { planTerms, type PlanTerms } from '../decisions/planTerms'
import type { Trial } from '../decisions/trialSchema'
import { callBins, type CallBins } from '../nights/callBins'
import { datedHalves } from './datedHalves'
import type { DatedVisit } from './types'
import { withoutVisits } from './withoutVisits'

export interface GivenSeason {
  order: readonly number[]
  /** As the call has it. */
  whole: CallBins
  /** What the visits that stand leave of it, for the queue. */
  season: CallBins
  terms: PlanTerms
  bins: NightBin[]
  /** Visits that stand, of the proposals in order. */
  visits: DatedVisit[]
}

/** The season as what is given divides it: the visits that stand taken out, and what may be planned of the rest. */
export async function givenSeason(
  db: Database,
  call: Call,
  order: readonly number[],
  trial?: Trial,
): Promise<GivenSeason> {
  const [whole, halves] = await Promise.all([callBins(db, call), standingHalves(db, call.id)])
  const season = withoutVisits(whole, datedHalves(halves, whole.dark))
  const terms = await planTerms(db, call, season, { proposalIds: order, trial })
  return {
    ...{ order, whole, season, terms },
    bins: keptBins(season.bins, terms.kept),
    visits: visitsOf(halves, whole).filter(({ proposal }) => order.includes(proposal)),
  }
}

/** Halves of nights as the visits they belong to. */
function visitsOf(halves: readonly StandingHalf[], { dark }: CallBins): DatedVisit[] {
  const keyOf = ({ proposalId, instrumentId }: StandingHalf) => `${proposalId} ${instrumentId}`
  return [...new Set(halves.map(keyOf))].flatMap((key): DatedVisit[] => {
    const own = halves.filter((half) => keyOf(half) === key)
    const [first] = own
    if (!first) return []
    return [
      {
        ...{ proposal: first.proposalId, instrument: first.instrumentId, telescope: first.telescopeId },
        seconds: own.reduce((sum, { seconds }) => sum + seconds, 0),
        halves: datedHalves(own, dark).sort((a, b) => a.from - b.from),
      },
    ]
  })
}
