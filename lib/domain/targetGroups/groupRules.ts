import { refuse } from '@/lib/errors'
import type { Target, TargetGroup } from '../proposals/types'
import { nameKey } from '../targets/targetRules'

/** The most groups one proposal holds. */
export const mostGroups = 50

/** Refuses a name another group has already. */
export function requireFreeGroupName(
  groups: readonly TargetGroup[],
  name: string,
  own: number | null,
  field: string,
): void {
  const taken = groups.some((group) => group.id !== own && nameKey(group.name) === nameKey(name))
  if (taken) throw refuse.field(field, 'Another group is called that already.')
}

/** Refuses more groups than a proposal holds. */
export function requireGroupRoom(present: number, added: number): void {
  if (present + added > mostGroups) throw refuse.invalid(`A proposal holds at most ${mostGroups} groups.`)
}

/** The name of a group as it is kept, from one typed in any case; refuses one that no group has. */
export function knownGroup(
  groups: readonly TargetGroup[],
  name: string | null,
  field: string,
): string | null {
  if (name === null) return null
  const found = groups.find((group) => nameKey(group.name) === nameKey(name))
  if (!found) throw refuse.field(field, `There is no group called ${name}.`)
  return found.name
}

/** The targets a group is given; refuses any that is not of the proposal. */
export function chosenTargets(targets: readonly Target[], ids: readonly number[]): Target[] {
  const chosen = targets.filter(({ id }) => ids.includes(id))
  if (chosen.length !== ids.length)
    throw refuse.invalid('The targets changed meanwhile. Load the page anew, then choose them again.')
  return chosen
}
