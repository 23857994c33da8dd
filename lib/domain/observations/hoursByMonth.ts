/** Hours added up by calendar month of the evening ('2027-07'), months in order, empty ones kept. */
export function hoursByMonth(
  dates: readonly string[],
  hours: readonly number[],
): { month: string; hours: number }[] {
  const sums = new Map<string, number>()
  dates.forEach((date, index) => {
    const month = date.slice(0, 7)
    sums.set(month, (sums.get(month) ?? 0) + (hours[index] ?? 0))
  })
  return [...sums].map(([month, sum]) => ({ month, hours: sum }))
}
