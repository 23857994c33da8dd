const day = 86_400_000

/**
 * How many proposals had arrived, by days before the deadline: from the first day shown to the deadline, or to `now`
 * while that lies ahead. What came before the first day counts from it; an extended proposal counts at the deadline.
 */
export function arrivalCurve(
  arrivals: readonly Date[],
  closesAt: Date,
  now: Date,
  daysShown: number,
): [number, number][] {
  const end = Math.min(0, (now.getTime() - closesAt.getTime()) / day)
  const days = arrivals
    .map((at) => Math.min(0, (at.getTime() - closesAt.getTime()) / day))
    .filter((at) => at <= end)
    .sort((a, b) => a - b)
  const before = days.filter((at) => at <= -daysShown).length
  const steps = days.slice(before).flatMap((at, index): [number, number][] => [
    [at, before + index],
    [at, before + index + 1],
  ])
  return end < -daysShown ? [] : [[-daysShown, before], ...steps, [end, days.length]]
}
