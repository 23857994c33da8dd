/** Sums a value a night into months, in order: the bars of a sparkline and the row under a season chart. */
export function monthSums(
  dates: readonly string[],
  byNight: readonly number[],
): { month: string; sum: number }[] {
  const sums = new Map<string, number>()
  dates.forEach((date, index) => {
    const month = date.slice(0, 7)
    sums.set(month, (sums.get(month) ?? 0) + (byNight[index] ?? 0))
  })
  return [...sums].map(([month, sum]) => ({ month, sum }))
}
