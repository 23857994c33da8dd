import type { Database } from '@/db/client'
import { standingChoices } from '@/db/queries/nightTerms'
import { standingContents } from '@/db/queries/versions'
import { keptLine } from '@/lib/panel/nights/allowFor'
import type { BinnedLine, NightBin } from '@/lib/panel/nights/binTypes'
import { byRankInBins } from '@/lib/panel/nights/byRankInBins'
import { binnedLine } from '../nights/binnedLine'
import type { CallBins } from '../nights/callBins'
import type { PanelDesk } from '../panels/openPanel'
import { callOrder } from '../sharing/callOrder'
import { dateOf, type VisitPlan } from '../visits/planVisits'
import type { PlanTerms } from './planTerms'
import { wantedLines } from './wantedLines'

/**
 * Time that the order of all panels keeps for proposals of other panels, as lines given elsewhere: what each would have
 * where all take their turns in that order. What a panel leaves over is then free for this one. Nothing where one panel
 * has all the proposals, before every list is frozen, and of a panel that has divided its nights: its awards stand.
 */
export async function keptForOthers(
  db: Database,
  desk: PanelDesk,
  found: {
    season: CallBins
    terms: PlanTerms
    bins: readonly NightBin[]
    /** Given to other panels, or to proposals of this one that the asker may not see. */
    standing: readonly BinnedLine[]
    /** This panel's visits have their nights, which the season lacks already. */
    visits: VisitPlan
  },
): Promise<BinnedLine[]> {
  const shared = await callOrder(db, desk.call.id)
  if (!shared) return []
  const panelOf = new Map(
    shared.lists.flatMap(({ panelId, proposals }) => proposals.map(({ id }) => [id, panelId] as const)),
  )
  const given = new Set(found.standing.map(({ proposal }) => proposal))
  const divided = new Set([...given].map((id) => panelOf.get(id)).filter((id) => id !== desk.panel.id))
  const waiting = shared.order.filter((id) => !given.has(id) && !divided.has(panelOf.get(id)))
  if (waiting.every((id) => panelOf.get(id) === desk.panel.id)) return []
  const [wanted, contents, choices] = await Promise.all([
    wantedLines(db, waiting),
    standingContents(db, waiting),
    standingChoices(db, waiting),
  ])
  const lines = waiting
    .filter((id) => !['never', 'filler'].includes(choices.get(id)?.choice ?? ''))
    .map((id) =>
      wanted
        .filter((line) => line.proposalId === id && !dateOf(found.visits, line))
        .flatMap((line): BinnedLine[] => {
          const held = contents.get(id)
          const asked = {
            ...{ proposal: id, instrument: line.instrumentId, telescope: line.telescopeId },
            ...{ seconds: line.wholeSeconds, least: line.leastSeconds, possible: line.possible },
          }
          return held ? [keptLine(binnedLine(asked, held, found.season), found.terms.kept)] : []
        }),
    )
    .filter((one) => one.length > 0)
  const plan = byRankInBins(lines, found.bins, found.standing)
  return plan.given
    .filter(({ proposal }) => panelOf.get(proposal) !== desk.panel.id)
    .flatMap(({ proposal, instrument, seconds, parts }) => {
      const line = lines.flat().find((one) => one.proposal === proposal && one.instrument === instrument)
      if (!line) return []
      const kept = line.parts.map((part, index) => ({ ...part, seconds: parts[index] ?? 0 }))
      return [{ ...line, seconds, least: seconds, parts: kept }]
    })
}
