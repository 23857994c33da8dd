import type { Claim, Pool, Share, ShareRule } from './types'

/** Splits whole seconds by whole weights: quotas cut to whole seconds, what is left to the largest remainders. */
function split(seconds: number, weights: readonly number[]): number[] {
  const sum = weights.reduce((total, weight) => total + weight, 0)
  if (sum === 0) return weights.map(() => 0)
  const total = BigInt(sum)
  const quotas = weights.map((weight) => BigInt(seconds) * BigInt(weight))
  const parts = quotas.map((quota) => Number(quota / total))
  const rest = seconds - parts.reduce((all, part) => all + part, 0)
  const first = quotas
    .map((quota, index) => ({ index, left: quota % total }))
    .sort((a, b) => (a.left === b.left ? a.index - b.index : a.left > b.left ? -1 : 1))
    .slice(0, rest)
  for (const { index } of first) parts[index] = (parts[index] ?? 0) + 1
  return parts
}

/**
 * The panels' shares of each pool, in whole seconds, by the method of largest remainders (Hamilton; ties go to the
 * panel that stands first). The shares of a pool add up to all of it. A pool of which nothing is asked is shared by no
 * panel; under a fixed rule it is shared whatever is asked.
 *
 * @param panels the panels in their order
 * @param percents for the fixed rule: whole percent of each panel, adding up to 100
 */
export function sharesOf(given: {
  rule: ShareRule
  pools: readonly Pool[]
  panels: readonly number[]
  claims: readonly Claim[]
  percents?: ReadonlyMap<number, number>
}): Share[] {
  const { rule, pools, panels, claims, percents } = given
  const weightOf = (panel: number, pool: number): number => {
    if (rule === 'fixed') return percents?.get(panel) ?? 0
    return claims
      .filter((claim) => claim.panel === panel && claim.pool === pool)
      .reduce((sum, claim) => sum + (rule === 'hours' ? claim.seconds : claim.proposals), 0)
  }
  return pools.flatMap((pool) => {
    const parts = split(
      pool.seconds,
      panels.map((panel) => weightOf(panel, pool.id)),
    )
    return panels.map((panel, index) => ({ panel, pool: pool.id, seconds: parts[index] ?? 0 }))
  })
}
