import type { RankedList, Share } from './types'

/**
 * How much of its panel's share is used once each proposal of a list, from the top, is given all it asks: the largest
 * over the pools that were asked so far. Never falls along the list. 0 while nothing is asked; infinite once something
 * is asked of a pool in which the panel has no share.
 */
export function usedShares(list: RankedList, shares: readonly Share[]): number[] {
  const share = new Map(
    shares.filter(({ panel }) => panel === list.panel).map(({ pool, seconds }) => [pool, seconds]),
  )
  const asked = new Map<number, number>()
  return list.proposals.map((proposal) => {
    for (const { pool, seconds } of proposal.asked) asked.set(pool, (asked.get(pool) ?? 0) + seconds)
    const parts = [...asked].map(([pool, seconds]) => (seconds === 0 ? 0 : seconds / (share.get(pool) ?? 0)))
    return Math.max(0, ...parts)
  })
}
