import type { MergedEntry, RankedList, Share } from './types'
import { usedShares } from './usedShares'

/**
 * The frozen lists of several panels as one order: by the part of its panel's share that is used with each proposal,
 * the least first. Where two are equal, the one of the higher rank in its own panel stands first, then that of the
 * panel that stands first. The order within a panel never changes, whatever the shares: what is used never falls
 * along a list.
 */
export function mergeByShare(lists: readonly RankedList[], shares: readonly Share[]): MergedEntry[] {
  return lists
    .flatMap((list, at) => {
      const used = usedShares(list, shares)
      return list.proposals.map(({ id }, index) => ({
        at,
        entry: { proposal: id, panel: list.panel, rank: index + 1, used: used[index] ?? 0 },
      }))
    })
    .sort((a, b) => byUsed(a.entry.used, b.entry.used) || a.entry.rank - b.entry.rank || a.at - b.at)
    .map(({ entry }) => entry)
}

/** Two infinite parts are equal; their difference would be no number. */
const byUsed = (a: number, b: number) => (a === b ? 0 : a - b)
