import type { Database } from '../client.ts'
import type { RankingEntriesRow, RankingsRow } from '../tables.ts'

/** The list that stands for a panel; null before its ranking has begun. */
export async function currentRanking(db: Database, panelId: number): Promise<RankingsRow | null> {
  const row = await db('rankings')
    .where({ panel_id: panelId })
    .whereNull('superseded_at')
    .orderBy('ranking_version', 'desc')
    .first()
  return row ?? null
}

/** The last frozen list before the one that stands. */
export async function lastFrozenBefore(db: Database, ranking: RankingsRow): Promise<RankingsRow | null> {
  const row = await db('rankings')
    .where({ panel_id: ranking.panel_id })
    .whereNotNull('frozen_at')
    .andWhere('ranking_version', '<', ranking.ranking_version)
    .orderBy('ranking_version', 'desc')
    .first()
  return row ?? null
}

/** Whether any list of a panel was frozen: a later change is made beside it, never in it. */
export async function hasFrozenRanking(db: Database, panelId: number): Promise<boolean> {
  const row = await db('rankings').where({ panel_id: panelId }).whereNotNull('frozen_at').first('id')
  return row !== undefined
}

/** Entries of a list, first place first. */
export function rankingEntries(db: Database, rankingId: number): Promise<RankingEntriesRow[]> {
  return db('ranking_entries').where({ ranking_id: rankingId }).orderBy(['place', 'id'])
}

export interface NewEntry {
  proposalId: number
  rawMean: number | null
  setAsideAt: Date | null
}

/** Starts the next version of a panel's list; the one that stood is superseded, and stays. */
export async function insertRanking(
  db: Database,
  given: { panelId: number; entries: readonly NewEntry[]; lineAfter: number; madeBy: number },
): Promise<number> {
  const last = await db('rankings').where({ panel_id: given.panelId }).max({ v: 'ranking_version' }).first()
  await db('rankings')
    .where({ panel_id: given.panelId })
    .whereNull('superseded_at')
    .update({ superseded_at: db.raw('UTC_TIMESTAMP(3)') as unknown as Date })
  const [id] = await db('rankings').insert({
    panel_id: given.panelId,
    ranking_version: Number(last?.v ?? 0) + 1,
    line_after: given.lineAfter,
    made_by: given.madeBy,
  })
  await db('ranking_entries').insert(
    given.entries.map((entry, index) => ({
      ranking_id: Number(id),
      proposal_id: entry.proposalId,
      place: index + 1,
      raw_mean: entry.rawMean,
      set_aside_at: entry.setAsideAt,
    })),
  )
  return Number(id)
}

/** Changes a list that still stands at `version`; false when someone was first. */
export async function changeRanking(
  db: Database,
  ranking: Pick<RankingsRow, 'id' | 'version'>,
  change: { line_after?: number; freeze?: boolean },
): Promise<boolean> {
  const count = await db('rankings')
    .where({ id: ranking.id, version: ranking.version })
    .whereNull('superseded_at')
    .update({
      ...(change.line_after === undefined ? {} : { line_after: change.line_after }),
      ...(change.freeze ? { frozen_at: db.raw('UTC_TIMESTAMP(3)') as unknown as Date } : {}),
      version: ranking.version + 1,
    })
  return count === 1
}

/** Writes the places anew, in the order given. */
export async function writePlaces(
  db: Database,
  rankingId: number,
  proposalIds: readonly number[],
): Promise<void> {
  for (const [index, proposal_id] of proposalIds.entries())
    await db('ranking_entries')
      .where({ ranking_id: rankingId, proposal_id })
      .whereNot({ place: index + 1 })
      .update({ place: index + 1 })
}

export async function writeSetAside(
  db: Database,
  rankingId: number,
  proposalIds: readonly number[],
  aside: boolean,
): Promise<void> {
  await db('ranking_entries')
    .where({ ranking_id: rankingId })
    .whereIn('proposal_id', proposalIds)
    .update({ set_aside_at: aside ? (db.raw('UTC_TIMESTAMP(3)') as unknown as Date) : null })
}

export async function insertMove(
  db: Database,
  move: { rankingId: number; proposalId: number; from: number; to: number; reason: string; by: number },
): Promise<void> {
  await db('rank_moves').insert({
    ranking_id: move.rankingId,
    proposal_id: move.proposalId,
    from_place: move.from,
    to_place: move.to,
    reason: move.reason,
    moved_by: move.by,
  })
}

export interface MoveByHand {
  proposalId: number
  isUp: boolean
  reason: string
  by: string | null
  at: Date
}

/** Moves by hand over all versions of a panel's list, the latest first. */
export async function movesByHand(db: Database, panelId: number): Promise<MoveByHand[]> {
  const rows = await db('rank_moves as m')
    .join('rankings as r', 'r.id', 'm.ranking_id')
    .leftJoin('people as a', 'a.id', 'm.moved_by')
    .where('r.panel_id', panelId)
    .orderBy('m.id', 'desc')
    .select('m.proposal_id', 'm.from_place', 'm.to_place', 'm.reason', 'm.created_at', 'a.name')
  return rows.map((row) => ({
    proposalId: row.proposal_id as number,
    isUp: row.to_place < row.from_place,
    reason: row.reason,
    by: row.name,
    at: row.created_at,
  }))
}

/** True when every panel of the call that has proposals under review has begun its ranking. */
export async function allPanelsRanked(db: Database, callId: number): Promise<boolean> {
  const open = await db('proposals as p')
    .where({ 'p.call_id': callId, 'p.state': 'under-review' })
    .whereNotExists(db('rankings as r').whereRaw('r.panel_id = p.panel_id').whereNull('r.superseded_at'))
    .first('p.id')
  return open === undefined
}
