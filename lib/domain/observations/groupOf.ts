import type { Target, TargetGroup } from '../proposals/types'

/** The group a target stands in; null when it stands by itself. */
export const groupOf = (target: Pick<Target, 'group'>, groups: readonly TargetGroup[]): TargetGroup | null =>
  groups.find(({ name }) => name === target.group) ?? null
