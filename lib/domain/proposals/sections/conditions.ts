import type { ProposalContents } from '../types'
import type { Missing } from './finding'

/** What the kind of proposal asks of conditions that are used, and they do not say: how often, and by when. */
export function conditionsLacking(
  { kind, constraintSets, observations }: Pick<ProposalContents, 'kind' | 'constraintSets' | 'observations'>,
  href: string,
): Missing[] {
  const used = new Set(observations.map(({ constraintSetId }) => constraintSetId))
  return constraintSets
    .filter(({ id }) => used.has(id))
    .flatMap(({ name, cadence, dateTo }) => [
      ...(kind.needsCadence && cadence === null ? [`${name}: say how often it is repeated.`] : []),
      ...(kind.needsLastNight && dateTo === null
        ? [`${name}: say by when it is needed, as the last evening.`]
        : []),
    ])
    .map((sentence) => ({ section: 'observing', field: null, sentence, href }))
}
