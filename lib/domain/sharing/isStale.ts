import type { MergedEntriesRow } from '@/db/tables'
import type { PanelList } from './panelLists'

/** Whether a list of all panels rests on lists that no longer stand, or are open again. */
export function isStale(
  entries: readonly Pick<MergedEntriesRow, 'proposal_id' | 'ranking_id'>[],
  lists: readonly PanelList[],
): boolean {
  const now = lists.flatMap(({ list, rankingId, order }) =>
    order.map((id) => `${id}:${list === 'frozen' ? (rankingId ?? 0) : 0}`),
  )
  const then = new Set(entries.map((entry) => `${entry.proposal_id}:${entry.ranking_id}`))
  return now.length !== then.size || now.some((one) => !then.has(one))
}
