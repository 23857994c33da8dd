const day = 86_400_000

/** The months of a season with how many of its evenings fall in each, in order. */
export function seasonMonths(from: string, to: string): { month: string; count: number }[] {
  const counts = new Map<string, number>()
  for (let at = Date.parse(from); at <= Date.parse(to); at += day) {
    const month = new Date(at).toISOString().slice(0, 7)
    counts.set(month, (counts.get(month) ?? 0) + 1)
  }
  return [...counts].map(([month, count]) => ({ month, count }))
}

/** `2027-07` as `July`. */
export const monthName = (month: string): string =>
  new Date(`${month}-01T00:00:00Z`).toLocaleString('en-GB', { month: 'long', timeZone: 'UTC' })
