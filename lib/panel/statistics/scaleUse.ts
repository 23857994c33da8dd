/** Scores on the scale of 0 to 10 in halves, counted by half point: 21 counts, the first for 0. */
export function scaleUse(halfPoints: readonly number[]): number[] {
  const counts = Array.from({ length: 21 }, () => 0)
  for (const half of halfPoints) counts[half] = (counts[half] ?? 0) + 1
  return counts
}
