import { connectedGroups } from '@/lib/panel/statistics'
import type { OptimalInput } from '@/lib/panel/assignment/optimalTypes'

export interface Enumerated {
  outsidePages: number
  worst: number
  sum: number
  isLinked: boolean
  /** Reviewers who read nothing. */
  idle: number
}

function choices<T>(from: readonly T[], count: number): T[][] {
  if (count === 0) return [[]]
  return from.flatMap((one, i) => choices(from.slice(i + 1), count - 1).map((rest) => [one, ...rest]))
}

/** Every assignment of a panel without standing pairs, by plain enumeration: for small panels only. */
export function everyAssignment(
  { proposals, reviewers, each, affinity }: OptimalInput,
  loads: { mean: number; tolerance: number },
): Enumerated[] {
  let lists: number[][][] = [[]]
  for (const { barred } of proposals) {
    const free = reviewers.filter((id) => !barred.has(id))
    const own = choices(free, Math.min(each, free.length))
    lists = lists.flatMap((list) => own.map((readers) => [...list, readers]))
  }
  const [least, most] = [Math.ceil(loads.mean - loads.tolerance), Math.floor(loads.mean + loads.tolerance)]
  return lists.map((list) => {
    const pages = reviewers.map((id) =>
      list.reduce((sum, readers, i) => sum + (readers.includes(id) ? (proposals[i]?.pages ?? 0) : 0), 0),
    )
    const served = list.map((readers, i) =>
      readers.reduce((sum, id) => sum + affinity(proposals[i]?.id ?? 0, id), 0),
    )
    const pairs = list.flatMap((readers, proposal) => readers.map((reviewer) => ({ proposal, reviewer })))
    return {
      outsidePages: pages.reduce((sum, load) => sum + Math.max(0, least - load, load - most), 0),
      worst: Math.min(...served.filter((_, i) => list[i]?.length === each)),
      sum: served.reduce((sum, one) => sum + one, 0),
      isLinked: connectedGroups(pairs).length <= 1,
      idle: pages.filter((load) => load === 0).length,
    }
  })
}
