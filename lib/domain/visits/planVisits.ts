import { placeVisits } from '@/lib/panel/nights/visits/placeVisits'
import type { AskedVisit, VisitNotPlaced, VisitsPlaced } from '@/lib/panel/nights/visits/types'
import type { Solve } from '@/lib/panel/solver/types'
import { solveInWorker } from '@/lib/services/solver/solveInWorker'
import type { WantedLine } from '../decisions/wantedLines'
import type { CallBins } from '../nights/callBins'
import type { ReportContents } from '../observations/reportContents'
import { askedVisit } from './askedVisit'
import type { DatedVisit, NightHalf } from './types'

/** The solver proves every answer: visits have dates to themselves. */
export const visitLimits = { seconds: 10, relativeGap: 0 }

export interface VisitPlan {
  /** In their turns. */
  asked: AskedVisit[]
  placed: VisitsPlaced
  dated: DatedVisit[]
  notPlaced: VisitNotPlaced[]
}

/** Visits put on dates of a season, in the order given. */
export async function planVisits(
  lines: readonly WantedLine[],
  contents: ReadonlyMap<number, ReportContents>,
  season: CallBins,
  seasonFrom: string,
  solve: Solve = solveInWorker,
): Promise<VisitPlan> {
  const found = lines.flatMap((line) => {
    const held = contents.get(line.proposalId)
    const one = held && askedVisit(line, held, season, seasonFrom)
    return one ? [one] : []
  })
  const halves = new Map(found.flatMap((one) => [...one.halves]))
  const asked = found.map(({ visit }) => visit)
  const placed = await placeVisits(asked, { solve, limits: visitLimits })
  const dated = placed.placed.map(({ visit, nights }): DatedVisit => {
    const own = nights.flatMap((night) =>
      night.halves.flatMap((key): NightHalf[] => {
        const half = halves.get(key)
        return half ? [half] : []
      }),
    )
    const { proposal, instrument, telescope } = visit
    const seconds = own.reduce((sum, half) => sum + half.seconds, 0)
    return { proposal, instrument, telescope, seconds, halves: own.sort((a, b) => a.from - b.from) }
  })
  return { asked, placed, dated, notPlaced: placed.notPlaced }
}

/** The visit of a line, if it has its dates. */
export const dateOf = (
  { dated }: Pick<VisitPlan, 'dated'>,
  line: Pick<WantedLine, 'proposalId' | 'instrumentId'>,
): DatedVisit | undefined =>
  dated.find(({ proposal, instrument }) => proposal === line.proposalId && instrument === line.instrumentId)
