import type { Score } from './types'

/**
 * Reviewers grouped by shared proposals: two are in one group when a chain of proposals leads from one to the other.
 * With more than one group, leniency and merit cannot be told apart between them.
 */
export function connectedGroups(pairs: readonly Pick<Score, 'proposal' | 'reviewer'>[]): number[][] {
  const readers = new Map<number, number[]>()
  const reads = new Map<number, number[]>()
  const push = (map: Map<number, number[]>, key: number, value: number) => {
    const list = map.get(key)
    if (list) list.push(value)
    else map.set(key, [value])
  }
  for (const { proposal, reviewer } of pairs) {
    push(readers, proposal, reviewer)
    push(reads, reviewer, proposal)
  }
  const seen = new Set<number>()
  const groups: number[][] = []
  for (const start of [...reads.keys()].sort((a, b) => a - b)) {
    if (seen.has(start)) continue
    const group: number[] = []
    const waiting = [start]
    seen.add(start)
    for (let next = waiting.pop(); next !== undefined; next = waiting.pop()) {
      group.push(next)
      for (const proposal of reads.get(next) ?? [])
        for (const reviewer of readers.get(proposal) ?? [])
          if (!seen.has(reviewer)) {
            seen.add(reviewer)
            waiting.push(reviewer)
          }
    }
    groups.push(group.sort((a, b) => a - b))
  }
  return groups
}
