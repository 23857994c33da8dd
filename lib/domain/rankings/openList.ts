import { insertRanking, rankingEntries, currentRanking } from '@/db/queries/rankings'
import type { RankingsRow } from '@/db/tables'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { openPanel, type PanelDesk } from '../panels/openPanel'
import { whyNotRanked } from '../panels/stages'
import type { ListKeyInput } from './schema'

export interface OpenList {
  desk: PanelDesk
  ranking: RankingsRow
  /** All proposals of the list in order, those kept from this person too. */
  order: number[]
}

/**
 * The list a verb is about to change, locked with its panel. A frozen list is never changed: its copy, the next
 * version, is opened in its place.
 */
export async function openList(tx: ActingContext, input: ListKeyInput): Promise<OpenList> {
  const desk = await openPanel(tx, { panelId: input.panelId, lock: true })
  const ranking = await currentRanking(tx.db, desk.panel.id)
  const why = whyNotRanked(desk.phase, ranking !== null)
  if (why || !ranking) throw refuse.closed(why ?? 'Begin the ranking first.')
  if (ranking.id !== input.rankingId || ranking.version !== input.version) throw staleList(desk, ranking)
  const entries = await rankingEntries(tx.db, ranking.id)
  const order = entries.map((entry) => entry.proposal_id)
  if (!ranking.frozen_at) return { desk, ranking, order }
  await insertRanking(tx.db, {
    panelId: desk.panel.id,
    entries: entries.map((entry) => ({
      proposalId: entry.proposal_id,
      rawMean: entry.raw_mean,
      setAsideAt: entry.set_aside_at,
    })),
    lineAfter: ranking.line_after ?? 0,
    madeBy: tx.actor.personId,
  })
  const next = await currentRanking(tx.db, desk.panel.id)
  if (!next) throw new Error('the new list is not there')
  return { desk, ranking: next, order }
}

export function staleList(desk: PanelDesk, ranking: RankingsRow) {
  return refuse.stale({
    changedBy: 'Someone else on the panel',
    changedAt: desk.now.toISOString(),
    version: ranking.version,
    theirs: { version: ranking.ranking_version },
  })
}
