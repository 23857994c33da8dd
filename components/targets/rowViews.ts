import { conditionsOf, worstVerdict } from '@/lib/domain/observations/rules'
import type { ProposalComputation } from '@/lib/domain/observations/types'
import type { ProposalContents, Target } from '@/lib/domain/proposals/types'
import type { RowView } from './targetTableTypes'

/** A row's place among the rows: its key, the kept target and the one being typed. */
export interface RowPlace {
  key: string
  kept: Target | null
  target: Target
}

/** Rows with everything their cells show. */
export function rowViews(
  places: readonly RowPlace[],
  contents: ProposalContents,
  computation: ProposalComputation,
): RowView[] {
  return places.map(({ key, kept, target }) => {
    const observations = contents.observations.filter(({ targetId }) => targetId === target.id)
    const numbers = computation.observations.filter(({ targetId }) => targetId === target.id)
    const isKnown = numbers.length > 0 && numbers.every(({ neededSeconds }) => neededSeconds !== null)
    return {
      key,
      kept,
      target,
      computed: computation.targets.find(({ targetId }) => targetId === target.id) ?? null,
      observations,
      observationNumbers: numbers,
      neededSeconds: isKnown ? numbers.reduce((sum, one) => sum + (one.neededSeconds ?? 0), 0) : null,
      verdict: worstVerdict(numbers.map((one) => one.verdict)),
      times: numbers[0]?.times ?? null,
      maxAirmass: conditionsOf(contents, observations[0]).maxAirmass,
    }
  })
}
