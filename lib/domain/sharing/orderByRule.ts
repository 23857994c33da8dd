import { mergeByShare } from '@/lib/panel/sharing/mergeByShare'
import type { MergedEntry, Share } from '@/lib/panel/sharing/types'
import type { PanelList } from './panelLists'

/** The lists of the panels as one order by their shares; of some of their proposals where only these are seen. */
export function orderByRule(
  lists: readonly PanelList[],
  shares: readonly Share[],
  isSeen: (proposalId: number) => boolean = () => true,
): MergedEntry[] {
  return mergeByShare(
    lists.map(({ panelId, order, lines }) => ({
      panel: panelId,
      proposals: order.filter(isSeen).map((id) => ({
        id,
        asked: lines
          .filter(({ proposalId }) => proposalId === id)
          .map(({ telescopeId, askedSeconds }) => ({ pool: telescopeId, seconds: askedSeconds })),
      })),
    })),
    shares,
  )
}
