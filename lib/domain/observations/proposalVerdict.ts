import type { Observation, Target } from '../proposals/types'
import type { ObservationComputation, Verdict } from './types'
import { worstVerdict } from './worstVerdict'

/**
 * The verdict of a whole request: the worst of its required targets, so that an optional or a backup target
 * that cannot be done does not sink it. Without required targets all count. A required target without an
 * observation makes it marginal: something is still to be said. Null when nothing is asked for.
 */
export function proposalVerdict(
  targets: readonly Pick<Target, 'id' | 'need'>[],
  observations: readonly Pick<Observation, 'targetId'>[],
  computed: readonly Pick<ObservationComputation, 'targetId' | 'verdict'>[],
): Verdict | null {
  if (computed.length === 0) return null
  const required = new Set(targets.filter(({ need }) => need === 'required').map(({ id }) => id))
  const counted = required.size > 0 ? computed.filter(({ targetId }) => required.has(targetId)) : computed
  const observed = new Set(observations.map(({ targetId }) => targetId))
  const missing = [...required].some((id) => !observed.has(id))
  return worstVerdict([...counted.map(({ verdict }) => verdict), ...(missing ? ['marginal' as const] : [])])
}
