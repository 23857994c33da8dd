import type { ProposalContents } from '../proposals/types'
import type { ProposalComputation, Verdict } from './types'
import { needOf } from './needOf'

const order: readonly Verdict[] = ['feasible', 'marginal', 'not-feasible']

/**
 * Whether the whole takes no harm from a target with this verdict: a backup does none, nor one whose group stands
 * better than it does, as it has enough of others.
 */
export function isSpared(
  { targetId, verdict }: { targetId: number; verdict: Verdict },
  { targets, groups }: Pick<ProposalContents, 'targets' | 'groups'>,
  computation: Pick<ProposalComputation, 'groups'>,
): boolean {
  const target = targets.find(({ id }) => id === targetId)
  if (!target) return false
  if (needOf(target, groups) === 'backup') return true
  const standing = computation.groups.find(({ name }) => name === target.group)?.verdict
  return standing ? order.indexOf(standing) < order.indexOf(verdict) : false
}
