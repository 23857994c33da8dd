import { givenByTelescope, standingAwards } from '@/db/queries/decisions'
import { offeredTime } from '@/db/queries/panel'
import { rankingEntries } from '@/db/queries/rankings'
import type { RankingsRow } from '@/db/tables'
import { byRankThenFill } from '@/lib/panel/nights/byRankThenFill'
import type { NightsPlan } from '@/lib/panel/nights/types'
import type { ActingContext } from '../context'
import type { PanelDesk } from '../panels/openPanel'
import { offeredByTelescope } from '../rankings/offered'
import { visibleLine, visibleOrder } from '../rankings/order'
import { wantedLines, type WantedLine } from './wantedLines'

export interface PlannedNights {
  order: number[]
  line: number
  setAside: ReadonlySet<number>
  wanted: WantedLine[]
  plan: NightsPlan
}

/**
 * The suggestion for the nights: by rank, then fill, over what the asker may see and what awards they do not see
 * leave free. Another policy can take its place here.
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
  const [wanted, blocks, given, own] = await Promise.all([
    wantedLines(ctx.db, order),
    offeredTime(ctx.db, desk.call.id),
    givenByTelescope(ctx.db, desk.call.id),
    standingAwards(ctx.db, order),
  ])
  const free = offeredByTelescope(blocks)
  for (const [id, seconds] of free) {
    const mine = own
      .filter((line) => line.telescopeId === id && !line.isReserve)
      .reduce((sum, line) => sum + line.seconds, 0)
    free.set(id, seconds - ((given.get(id) ?? 0) - mine))
  }
  const plan = byRankThenFill({
    asked: order
      .filter((id) => !setAside.has(id))
      .map((id) =>
        wanted
          .filter((line) => line.proposalId === id)
          .map((line) => ({
            proposal: id,
            instrument: line.instrumentId,
            telescope: line.telescopeId,
            seconds: line.wholeSeconds,
            least: line.leastSeconds,
            possible: line.possible,
          })),
      )
      .filter((lines) => lines.length > 0),
    line: visibleLine(full, desk.hidden, ranking.line_after ?? 0),
    offered: free,
  })
  return { order, line: visibleLine(full, desk.hidden, ranking.line_after ?? 0), setAside, wanted, plan }
}
