import { awardsOutside } from '@/db/queries/awardsOutside'
import { rankingEntries } from '@/db/queries/rankings'
import { standingContents } from '@/db/queries/versions'
import type { RankingsRow } from '@/db/tables'
import type { BinnedLine, BinnedPlan } from '@/lib/panel/nights/binTypes'
import { byRankInBins } from '@/lib/panel/nights/byRankInBins'
import type { ActingContext } from '../context'
import { binnedLine } from '../nights/binnedLine'
import { callBins } from '../nights/callBins'
import type { SeasonBins } from '../nights/seasonBins'
import type { PanelDesk } from '../panels/openPanel'
import { visibleLine, visibleOrder } from '../rankings/order'
import { wantedLines, type WantedLine } from './wantedLines'

export interface PlannedNights {
  order: number[]
  line: number
  setAside: ReadonlySet<number>
  wanted: WantedLine[]
  season: SeasonBins
  /** In ranking order, without what is set aside. */
  asked: BinnedLine[][]
  /** Given by other panels, or to proposals that the asker may not see. */
  standing: BinnedLine[]
  plan: BinnedPlan
}

/**
 * The suggestion for the nights: by rank, then fill, in the bins each can use, over what the asker may see and
 * what is given elsewhere.
 */
export async function planNights(
  ctx: Pick<ActingContext, 'db'>,
  desk: PanelDesk,
  ranking: RankingsRow,
): Promise<PlannedNights> {
  const entries = await rankingEntries(ctx.db, ranking.id)
  const full = entries.map((entry) => entry.proposal_id)
  const shown = new Set(desk.proposals.map(({ id }) => id))
  const order = visibleOrder(full, desk.hidden).filter((id) => shown.has(id))
  const setAside = new Set(
    entries.flatMap((entry) => (entry.set_aside_at === null ? [] : [entry.proposal_id])),
  )
  const elsewhere = await awardsOutside(ctx.db, desk.call.id, order)
  const [wanted, season, contents] = await Promise.all([
    wantedLines(ctx.db, order),
    callBins(ctx.db, desk.call),
    standingContents(ctx.db, [...order, ...elsewhere.map(({ proposalId }) => proposalId)]),
  ])
  const binned = (line: {
    proposalId: number
    instrumentId: number
    telescopeId: number
    seconds: number
    least: number
    possible: boolean
  }): BinnedLine[] => {
    const held = contents.get(line.proposalId)
    const {
      proposalId: proposal,
      instrumentId: instrument,
      telescopeId: telescope,
      seconds,
      least,
      possible,
    } = line
    return held
      ? [binnedLine({ proposal, instrument, telescope, seconds, least, possible }, held, season)]
      : []
  }
  const asked = order
    .filter((id) => !setAside.has(id))
    .map((id) =>
      wanted
        .filter((line) => line.proposalId === id)
        .flatMap((line) => binned({ ...line, seconds: line.wholeSeconds, least: line.leastSeconds })),
    )
    .filter((lines) => lines.length > 0)
  const standing = elsewhere.flatMap((line) => binned({ ...line, least: line.seconds, possible: true }))
  const line = visibleLine(full, desk.hidden, ranking.line_after ?? 0)
  const plan = byRankInBins(asked, season.bins, standing)
  return { order, line, setAside, wanted, season, asked, standing, plan }
}
