interface Pair {
  proposal: number
  reviewer: number
}

/** The proposal whose readers know it least together, of those that are not short of readers; null where there is none. */
export function servedWorst(
  proposals: readonly number[],
  made: readonly Pair[],
  affinity: (proposal: number, reviewer: number) => number,
): number | null {
  const sums = new Map(proposals.map((id) => [id, 0]))
  for (const { proposal, reviewer } of made) {
    const sum = sums.get(proposal)
    if (sum !== undefined) sums.set(proposal, sum + affinity(proposal, reviewer))
  }
  const [worst] = [...sums].sort(([a, sumA], [b, sumB]) => sumA - sumB || a - b)
  return worst?.[0] ?? null
}
