import { standingAwards, type StandingAward } from '@/db/queries/decisions'
import { standingContents } from '@/db/queries/versions'
import type { Database } from '@/db/client'
import { keptLine } from '@/lib/panel/nights/allowFor'
import type { BinnedLine } from '@/lib/panel/nights/binTypes'
import { fillerLine } from '@/lib/panel/nights/fillerLine'
import { binnedLine } from '../nights/binnedLine'
import type { ReportContents } from '../observations/reportContents'
import type { PlannedNights } from './planNights'

/** What the suggestion gives, in the order of its turns. */
export function suggestedLines({ plan, asked }: PlannedNights): BinnedLine[] {
  return asked.inTurn.flat().flatMap((line) => {
    const given = plan.given.find(
      ({ proposal, instrument }) => proposal === line.proposal && instrument === line.instrument,
    )
    if (!given) return []
    const parts = line.parts.map((part, at) => ({ ...part, seconds: given.parts[at] ?? 0 }))
    return [{ ...line, seconds: given.seconds, parts: parts.filter(({ seconds }) => seconds > 0) }]
  })
}

/** What stands given, as it is laid and run; with what it was given for. */
export interface GivenRun {
  award: StandingAward
  contents: ReportContents
  line: BinnedLine
}

/**
 * What stands given in the queue, by rank, fillers behind it and what is in reserve last; shared among targets as it was
 * asked. Visits have dates of their own.
 */
export async function givenRuns(
  db: Database,
  planned: Pick<PlannedNights, 'season' | 'bins' | 'terms'> & { order: readonly number[] },
): Promise<GivenRun[]> {
  const { order, season, bins, terms } = planned
  const [awards, contents] = await Promise.all([standingAwards(db, order), standingContents(db, order)])
  const isFiller = (id: number) => terms.choices.get(id)?.choice === 'filler'
  const turn = (award: StandingAward) =>
    order.indexOf(award.proposalId) +
    (isFiller(award.proposalId) ? order.length : 0) +
    (award.isReserve ? 2 * order.length : 0)
  return [...awards]
    .filter(({ seconds, service }) => seconds > 0 && service === 'queue')
    .sort((a, b) => turn(a) - turn(b))
    .flatMap((award) => {
      const { proposalId, instrumentId: instrument, telescopeId: telescope, seconds } = award
      const held = contents.get(proposalId)
      if (!held) return []
      const facts = { proposal: proposalId, instrument, telescope, seconds, least: 0, possible: true }
      const line = keptLine(binnedLine(facts, held, season), terms.kept)
      return [{ award, contents: held, line: isFiller(proposalId) ? fillerLine(line, bins) : line }]
    })
}
