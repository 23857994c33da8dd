import type { OutsideAward } from '@/db/queries/awardsOutside'
import { keptBins, keptLine } from '@/lib/panel/nights/allowFor'
import type { BinnedLine, BinnedPlan } from '@/lib/panel/nights/binTypes'
import { byRankInBins } from '@/lib/panel/nights/byRankInBins'
import type { ActingContext } from '../context'
import { binnedLine } from '../nights/binnedLine'
import type { CallBins } from '../nights/callBins'
import type { ReportContents } from '../observations/reportContents'
import type { PanelDesk } from '../panels/openPanel'
import { dateOf, type VisitPlan } from '../visits/planVisits'
import { isVisit } from '../visits/visitLines'
import { arrangeAsked } from './arrangeAsked'
import { keptForOthers } from './keptForOthers'
import { meritOf } from './meritOf'
import { planByMerit } from './planByMerit'
import type { PlannedNights } from './planNights'
import type { PlanTerms } from './planTerms'
import { nightsPolicy, type NightsPolicy } from './policyWords'
import { summaryOf } from './policySummary'
import type { WantedLine } from './wantedLines'

/** A line to lay, as it was asked or given. */
interface LineFacts {
  proposalId: number
  instrumentId: number
  telescopeId: number
  seconds: number
  least: number
  possible: boolean
}

interface QueueInput {
  order: readonly number[]
  setAside: ReadonlySet<number>
  above: ReadonlySet<number>
  wanted: readonly WantedLine[]
  elsewhere: readonly OutsideAward[]
  contents: ReadonlyMap<number, ReportContents>
  season: CallBins
  terms: PlanTerms
  visits: VisitPlan
  policy: NightsPolicy
  sideBySide: boolean
}

export type DividedQueue = Pick<
  PlannedNights,
  'bins' | 'asked' | 'standing' | 'policy' | 'plan' | 'policies'
> & {
  /** Proposals with a line in the queue that is given nothing. */
  withoutQueue: ReadonlySet<number>
}

/** The queue divided over what visits leave; what visits have stands among what is given. */
export async function divideQueue(
  ctx: Pick<ActingContext, 'db'>,
  desk: PanelDesk,
  input: QueueInput,
): Promise<DividedQueue> {
  const { order, setAside, wanted, elsewhere, contents, season, terms, visits } = input
  const bins = keptBins(season.bins, terms.kept)
  const binned = (facts: LineFacts): BinnedLine[] => {
    const held = contents.get(facts.proposalId)
    if (!held) return []
    const { proposalId: proposal, instrumentId: instrument, telescopeId: telescope, ...rest } = facts
    const { seconds, least, possible } = rest
    const line = { proposal, instrument, telescope, seconds, least, possible }
    return [keptLine(binnedLine(line, held, season), terms.kept)]
  }
  const given = elsewhere.flatMap((line) => binned({ ...line, least: line.seconds, possible: true }))
  const kept = await keptForOthers(ctx.db, desk, { season, terms, bins, standing: given, visits })
  const standing = [...given, ...kept]
  const queued = order
    .filter((id) => !setAside.has(id))
    .map((id) => {
      const own = wanted.filter((line) => line.proposalId === id)
      const visit = own.filter((line) => isVisit(line, terms.choices))
      // Time on all its instruments or on none: without its visit the rest is of no use.
      if (visit.some((line) => !dateOf(visits, line))) return []
      return own
        .filter((line) => !visit.includes(line))
        .flatMap((line) => binned({ ...line, seconds: line.wholeSeconds, least: line.leastSeconds }))
    })
    .filter((lines) => lines.length > 0)
  const asked = await arrangeAsked(queued, terms.choices, { bins, standing })
  const found = await planned(ctx, desk, { ...input, asked, bins, standing })
  const withoutQueue = new Set(found.plan.notGiven.map(({ proposal }) => proposal))
  return { bins, asked, standing, withoutQueue, ...found }
}

/** A plan with the visits among what it gives. */
function withDated(plan: BinnedPlan, { dated }: VisitPlan): BinnedPlan {
  const given = dated.map(({ proposal, instrument, telescope, seconds }) => ({
    ...{ proposal, instrument, telescope, seconds },
    ...{ laid: new Map<number, number>(), parts: [] },
  }))
  return { given: [...given, ...plan.given], notGiven: plan.notGiven }
}

/** The plan of a policy, and what each would come to. */
async function planned(
  ctx: Pick<ActingContext, 'db'>,
  desk: PanelDesk,
  given: QueueInput & Pick<PlannedNights, 'asked' | 'bins' | 'standing'>,
): Promise<Pick<PlannedNights, 'policy' | 'plan' | 'policies'>> {
  const { policy, sideBySide, asked, bins, standing, above, visits } = given
  const byRank = withDated(byRankInBins(asked.inTurn, bins, standing), visits)
  if (policy === 'rank' && !sideBySide) return { policy, plan: byRank, policies: [] }
  const merit = await meritOf(ctx.db, desk)
  const solved = await planByMerit({
    asked: [...asked.byRank, ...asked.fillers],
    line: asked.byRank.filter(([first]) => first && above.has(first.proposal)).length,
    bins,
    standing,
    merit,
    must: asked.must,
  })
  const why = 'why' in solved ? solved.why : null
  const byMerit = 'why' in solved ? null : withDated(solved, visits)
  const gap =
    'why' in solved || solved.boundMeritHours <= 0
      ? null
      : Math.max(0, 1 - solved.meritHours / solved.boundMeritHours)
  const summarised = { rank: byRank, merit: byMerit }
  return {
    policy: policy === 'merit' && byMerit ? 'merit' : 'rank',
    plan: policy === 'merit' && byMerit ? byMerit : byRank,
    policies: nightsPolicy.options.map((name) =>
      summaryOf(name, summarised[name], { above, merit, gap: name === 'merit' ? gap : null, why }),
    ),
  }
}
