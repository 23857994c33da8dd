import type { PeopleCount } from './types'

/** The least number of people that is told. */
export const leastTold = 5

/**
 * Counts of people with the small ones held back. Where only one would be, the next smallest is held back too:
 * otherwise the sum would tell it. None stays none.
 */
export function withoutSmallCells(
  counts: readonly { name: string; count: number }[],
  least = leastTold,
): PeopleCount[] {
  const isSmall = (count: number) => count > 0 && count < least
  const small = counts.filter(({ count }) => isSmall(count))
  const others = counts.filter(({ count }) => count >= least).toSorted((a, b) => a.count - b.count)
  const also = small.length === 1 ? others[0] : undefined
  return counts.map((cell) => ({
    name: cell.name,
    count: isSmall(cell.count) || cell === also ? null : cell.count,
  }))
}
