import type { Solve, SolveLimits } from '../../solver/types'
import { mostAlone, runsOf } from './runsOf'
import type { AskedVisit, PlacedVisit, VisitNotPlaced, VisitsPlaced } from './types'
import { VisitsProgramme, type CountedVisit } from './visitsProgramme'

interface Solver {
  solve: Solve
  limits: SolveLimits
}

/** A visit put beside others that stay where they are; null where it must have one of theirs. */
function beside(placed: readonly PlacedVisit[], { visit, count }: CountedVisit): PlacedVisit | null {
  const taken = new Set(placed.flatMap(({ nights }) => nights.flatMap(({ halves }) => halves)))
  const mayBe = visit.mayBe.filter(({ halves }) => !halves.some((half) => taken.has(half)))
  const nights = visit.together ? runsOf({ mayBe }, count)[0] : mayBe.slice(0, count)
  return nights?.length === count ? { visit, nights } : null
}

async function solved(
  counted: readonly CountedVisit[],
  { solve, limits }: Solver,
): Promise<PlacedVisit[] | null> {
  const programme = new VisitsProgramme(counted)
  const answer = await solve(programme.build(), limits)
  return answer.values ? programme.placedBy(answer.values) : null
}

/**
 * Visits on dates, in their order: each has as many of its nights as it can while those before it keep the number of
 * theirs, though not their dates, or none where that is fewer than are of use. Exact, by an integer programme wherever
 * the next finds no place beside the others. Dates: the most usable hours in all, of equals the earlier. No half of a
 * night is had twice.
 */
export async function placeVisits(asked: readonly AskedVisit[], solver: Solver): Promise<VisitsPlaced> {
  let counted: CountedVisit[] = []
  let placed: PlacedVisit[] = []
  const notPlaced: VisitNotPlaced[] = []
  for (const visit of asked) {
    const most = mostAlone(visit)
    let isIn = false
    for (let count = most; count >= visit.least && count > 0 && !isIn; count -= 1) {
      const next = { visit, count }
      const own = beside(placed, next)
      const all = own ? [...placed, own] : await solved([...counted, next], solver)
      if (!all) continue
      placed = all
      counted = [...counted, next]
      isIn = true
    }
    if (isIn) continue
    const reason = most < visit.least || most === 0 ? 'no-nights' : 'nights-taken'
    notPlaced.push({ proposal: visit.proposal, instrument: visit.instrument, reason, most })
  }
  const best = counted.length > 0 ? await solved(counted, solver) : null
  return { placed: best ?? placed, notPlaced }
}
