import type { Database } from '@/db/client'
import { panelsOfCall } from '@/db/queries/approvals'
import { lastFrozenMerged, mergedEntries } from '@/db/queries/mergedLists'
import { isStale } from './isStale'
import { orderByRule } from './orderByRule'
import { panelLists, type PanelList } from './panelLists'
import { sharedTime } from './sharedTime'

/**
 * The order in which the proposals of several panels come to the nights: that frozen last by their meeting, while it
 * rests on the lists that stand; else as the rule gives it. Null where one panel alone has proposals, and until every
 * panel has frozen its list.
 */
export async function callOrder(
  db: Database,
  callId: number,
): Promise<{ order: number[]; lists: PanelList[] } | null> {
  const panels = await panelsOfCall(db, callId)
  if (panels.length < 2) return null
  const lists = await panelLists(db, panels)
  const judging = lists.filter(({ proposals }) => proposals.length > 0)
  if (judging.length < 2 || judging.some(({ list }) => list !== 'frozen')) return null
  const frozen = await lastFrozenMerged(db, callId)
  const entries = frozen ? await mergedEntries(db, frozen.id) : []
  if (frozen && !isStale(entries, lists)) return { order: entries.map((one) => one.proposal_id), lists }
  const { shares } = await sharedTime(db, callId, lists)
  return { order: orderByRule(lists, shares).map(({ proposal }) => proposal), lists }
}
