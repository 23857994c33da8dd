import type { Target, TargetGroup } from '../proposals/types'
import { groupOf } from './groupOf'

/** How much a target is needed: `shared` where a group wants some of several, whichever they are. */
export type Need = Target['need'] | 'shared'

/** How much a target is needed, by the rule of its group, or by its own word where it is in none. */
export function needOf(target: Pick<Target, 'group' | 'need'>, groups: readonly TargetGroup[]): Need {
  const group = groupOf(target, groups)
  if (!group) return target.need
  if (group.rule === 'at-least') return 'shared'
  return group.rule === 'backup' ? 'backup' : 'required'
}
