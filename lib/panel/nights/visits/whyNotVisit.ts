import type { Solve, SolveLimits } from '../../solver/types'
import { placeVisits } from './placeVisits'
import type { AskedVisit, VisitsPlaced } from './types'

export interface DisplacedVisit {
  proposal: number
  instrument: number
  /** Seconds without and with the visit put first. */
  fromSeconds: number
  toSeconds: number
}

/** What giving a visit its nights would cost other visits: they are placed again with it in first place. */
export async function whyNotVisit(
  asked: readonly AskedVisit[],
  before: VisitsPlaced,
  which: { proposal: number; instrument: number },
  solver: { solve: Solve; limits: SolveLimits },
): Promise<DisplacedVisit[]> {
  const isOwn = (one: typeof which) => one.proposal === which.proposal && one.instrument === which.instrument
  const own = asked.filter(isOwn)
  const others = asked.filter((visit) => !isOwn(visit))
  const after = await placeVisits([...own, ...others], solver)
  const secondsIn = ({ placed }: VisitsPlaced, { proposal, instrument }: AskedVisit) =>
    placed
      .filter(({ visit }) => visit.proposal === proposal && visit.instrument === instrument)
      .reduce((sum, { nights }) => sum + nights.reduce((all, { seconds }) => all + seconds, 0), 0)
  return others
    .map((visit) => ({
      ...{ proposal: visit.proposal, instrument: visit.instrument },
      ...{ fromSeconds: secondsIn(before, visit), toSeconds: secondsIn(after, visit) },
    }))
    .filter(({ fromSeconds, toSeconds }) => toSeconds < fromSeconds)
}
