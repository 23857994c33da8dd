import type { Target, TargetGroup } from '../proposals/types'
import { nameKey } from '../targets/targetRules'

/** The groups that rows name and a proposal has not, each once, as it is first written. */
export function unknownGroups(
  groups: readonly Pick<TargetGroup, 'name'>[],
  rows: readonly Pick<Target, 'group'>[],
): string[] {
  const known = new Set(groups.map(({ name }) => nameKey(name)))
  return rows.flatMap(({ group }) => {
    if (group === null || known.has(nameKey(group))) return []
    known.add(nameKey(group))
    return [group]
  })
}
