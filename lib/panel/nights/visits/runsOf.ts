import type { AskedVisit, VisitNight } from './types'

/** Every way for a visit to have so many nights that follow one another, the earliest first. */
export function runsOf({ mayBe }: Pick<AskedVisit, 'mayBe'>, count: number): (readonly VisitNight[])[] {
  return mayBe.flatMap((first, at) => {
    const run = mayBe.slice(at, at + count)
    return run.length === count && run.every(({ day }, i) => day === first.day + i) ? [run] : []
  })
}

/** The most nights a visit would find with nobody in its way. */
export function mostAlone(visit: AskedVisit): number {
  if (!visit.together) return Math.min(visit.nights, visit.mayBe.length)
  let count = visit.nights
  while (count > 0 && runsOf(visit, count).length === 0) count -= 1
  return count
}
