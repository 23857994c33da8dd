import { currentMerged, insertMerged, mergedEntries } from '@/db/queries/mergedLists'
import type { MergedEntriesRow, MergedListsRow } from '@/db/tables'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { databaseNow } from '@/db/queries/clock'
import type { ActingContext } from '../context'
import { isStale } from './isStale'
import { openCallPanels, type CallPanels } from './openCallPanels'
import { panelLists, type PanelList } from './panelLists'
import { maySitAtMerge } from './policy'
import type { MergedKeyInput } from './schema'

export interface OpenMerged {
  desk: CallPanels
  lists: PanelList[]
  list: MergedListsRow
  entries: MergedEntriesRow[]
}

/** The list of all panels that a verb is about to change or freeze, locked with its call. */
export async function openMerged(tx: ActingContext, input: MergedKeyInput): Promise<OpenMerged> {
  const desk = await openCallPanels(tx, { callId: input.callId })
  authorize(maySitAtMerge(desk.led.length > 0))
  if (desk.phase === 'decided' || desk.phase === 'archived')
    throw refuse.closed('The decisions of this call are made known: the order stands.')
  const list = await currentMerged(tx.db, desk.call.id)
  if (!list) throw refuse.closed('Bring the lists together first.')
  if (list.id !== input.listId || list.version !== input.version) throw await staleMerged(tx, list)
  const entries = await mergedEntries(tx.db, list.id)
  const lists = await panelLists(tx.db, desk.panels)
  if (isStale(entries, lists))
    throw refuse.closed('A panel has changed its list since: bring the lists together anew.')
  return { desk, lists, list, entries }
}

/** A frozen list is never changed: its copy, the next version, is opened in its place. */
export async function changeable(
  tx: ActingContext,
  { desk, list, entries }: OpenMerged,
): Promise<MergedListsRow> {
  if (!list.frozen_at) return list
  await insertMerged(tx.db, {
    callId: desk.call.id,
    entries: entries.map((entry) => ({
      proposalId: entry.proposal_id,
      rankingId: entry.ranking_id,
      usedShare: entry.used_share,
      isNear: Boolean(entry.is_near),
    })),
    madeBy: tx.actor.personId,
  })
  const next = await currentMerged(tx.db, desk.call.id)
  if (!next) throw new Error('the new list is not there')
  return next
}

export async function staleMerged(tx: ActingContext, list: MergedListsRow) {
  return refuse.stale({
    changedBy: 'Someone else at the meeting',
    changedAt: (await databaseNow(tx.db)).toISOString(),
    version: list.version,
    theirs: { version: list.list_version },
  })
}
