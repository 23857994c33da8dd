import type { Target, TargetGroup } from '../proposals/types'
import type { GroupRow } from './schema'

/** A group as its form shows it; null gives an empty one. */
export function groupRow(
  group: TargetGroup | null,
  targets: readonly Pick<Target, 'id' | 'group'>[],
): GroupRow {
  if (!group) return { name: '', rule: 'at-least', atLeast: '', hoursFor: 'all', targetIds: [] }
  return {
    name: group.name,
    rule: group.rule,
    atLeast: group.atLeast === null ? '' : String(group.atLeast),
    hoursFor: group.hoursFor,
    targetIds: targets.filter((target) => target.group === group.name).map(({ id }) => String(id)),
  }
}
