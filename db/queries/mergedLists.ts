import type { Database } from '../client.ts'
import type { MergedEntriesRow, MergedListsRow } from '../tables.ts'
import { utcNow } from '../utcNow.ts'

/** The list of all panels that stands for a call; null before they were brought together. */
export async function currentMerged(db: Database, callId: number): Promise<MergedListsRow | null> {
  const row = await db('merged_lists').where({ call_id: callId }).whereNull('superseded_at').first()
  return row ?? null
}

/** The list of all panels frozen last, among those up to a version. */
export async function lastFrozenMerged(
  db: Database,
  callId: number,
  before = Number.MAX_SAFE_INTEGER,
): Promise<MergedListsRow | null> {
  const row = await db('merged_lists')
    .where({ call_id: callId })
    .whereNotNull('frozen_at')
    .andWhere('list_version', '<', before)
    .orderBy('list_version', 'desc')
    .first()
  return row ?? null
}

/** Entries of a list, first place first. */
export function mergedEntries(db: Database, listId: number): Promise<MergedEntriesRow[]> {
  return db('merged_entries').where({ list_id: listId }).orderBy(['place', 'id'])
}

export interface NewMergedEntry {
  proposalId: number
  rankingId: number
  usedShare: number | null
  isNear: boolean
}

/** Starts the next version of a call's list of all panels; the one that stood is superseded, and stays. */
export async function insertMerged(
  db: Database,
  given: { callId: number; entries: readonly NewMergedEntry[]; madeBy: number },
): Promise<number> {
  const last = await db('merged_lists').where({ call_id: given.callId }).max({ v: 'list_version' }).first()
  await db('merged_lists')
    .where({ call_id: given.callId })
    .whereNull('superseded_at')
    .update({ superseded_at: utcNow(db) })
  const [id] = await db('merged_lists').insert({
    call_id: given.callId,
    list_version: Number(last?.v ?? 0) + 1,
    made_by: given.madeBy,
  })
  await db('merged_entries').insert(
    given.entries.map((entry, index) => ({
      list_id: Number(id),
      proposal_id: entry.proposalId,
      ranking_id: entry.rankingId,
      place: index + 1,
      used_share: entry.usedShare,
      is_near: entry.isNear ? 1 : 0,
    })),
  )
  return Number(id)
}

/** Counts a change of a list that still stands at its version; false when someone was first. */
export async function changeMerged(
  db: Database,
  list: Pick<MergedListsRow, 'id' | 'version'>,
  change: { freeze?: boolean } = {},
): Promise<boolean> {
  const count = await db('merged_lists')
    .where({ id: list.id, version: list.version })
    .whereNull('superseded_at')
    .update({ ...(change.freeze ? { frozen_at: utcNow(db) } : {}), version: list.version + 1 })
  return count === 1
}

/** Writes the places anew, in the order given. */
export async function writeMergedPlaces(
  db: Database,
  listId: number,
  proposalIds: readonly number[],
): Promise<void> {
  for (const [index, proposal_id] of proposalIds.entries())
    await db('merged_entries')
      .where({ list_id: listId, proposal_id })
      .whereNot({ place: index + 1 })
      .update({ place: index + 1 })
}

export async function insertMergeMove(
  db: Database,
  move: { listId: number; proposalId: number; from: number; to: number; reason: string; by: number },
): Promise<void> {
  await db('merge_moves').insert({
    list_id: move.listId,
    proposal_id: move.proposalId,
    from_place: move.from,
    to_place: move.to,
    reason: move.reason,
    moved_by: move.by,
  })
}

export interface MergeMove {
  proposalId: number
  isUp: boolean
  reason: string
  by: string | null
  at: Date
}

/** Moves of a call's meeting over all versions of its list, the latest first. */
export async function mergeMoves(db: Database, callId: number): Promise<MergeMove[]> {
  const rows = await db('merge_moves as m')
    .join('merged_lists as l', 'l.id', 'm.list_id')
    .leftJoin('people as a', 'a.id', 'm.moved_by')
    .where('l.call_id', callId)
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
