import { createHash } from 'node:crypto'
import { mostMeritInBins, type MeritInput, type MeritPlan } from '@/lib/panel/nights/mostMeritInBins'
import type { Solve } from '@/lib/panel/solver/types'
import { solveInWorker } from '@/lib/services/solver/solveInWorker'
import { boundedMap } from '../observations/boundedMap'

/** A tenth of a per cent is far finer than any demand is known. */
const limits = { seconds: 20, relativeGap: 0.001 }

const kept = boundedMap<Promise<MeritPlan | { why: string }>>(16)

/** What the answer depends on, as one word. */
function fingerprint({ asked, line, bins, standing, merit, must }: MeritInput): string {
  const text = JSON.stringify([asked, line, bins, standing, [...merit], must], (_, value: unknown) =>
    value instanceof Map ? [...value] : value,
  )
  return createHash('sha256').update(text).digest('hex')
}

/** The plan of most merit above the line, solved once for each state of the list, the nights and the awards. */
export function planByMerit(
  input: MeritInput,
  solve: Solve = solveInWorker,
): Promise<MeritPlan | { why: string }> {
  return kept.getOr(fingerprint(input), () => mostMeritInBins(input, solve, limits))
}
