/** Two runs longer than this, in pairs of pieces, count as having nothing in common. */
const mostPairs = 4_000_000

/**
 * Which of `before` and `after` belong together: the longest common subsequence, as pairs of places; none where the
 * two are too long to be compared.
 */
export function commonPairs(before: readonly string[], after: readonly string[]): [number, number][] {
  const [n, m] = [before.length, after.length]
  if (n * m > mostPairs) return []
  // lengths[i][j]: of the longest common subsequence of what follows places i and j.
  const lengths = Array.from({ length: n + 1 }, () => new Uint32Array(m + 1))
  const at = (i: number, j: number) => lengths[i]?.[j] ?? 0
  for (let i = n - 1; i >= 0; i -= 1) {
    const row = lengths[i]
    for (let j = m - 1; row && j >= 0; j -= 1)
      row[j] = before[i] === after[j] ? at(i + 1, j + 1) + 1 : Math.max(at(i + 1, j), at(i, j + 1))
  }
  const found: [number, number][] = []
  for (let i = 0, j = 0; i < n && j < m;) {
    if (before[i] === after[j]) found.push([i++, j++])
    else if (at(i + 1, j) >= at(i, j + 1)) i += 1
    else j += 1
  }
  return found
}
