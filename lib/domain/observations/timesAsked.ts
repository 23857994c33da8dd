import type { Observation, ProposalContents, Target, TargetGroup } from '../proposals/types'
import { groupOf } from './groupOf'

type Contents = Pick<ProposalContents, 'targets' | 'groups'> & {
  observations: readonly Pick<Observation, 'targetId' | 'askedSeconds'>[]
}

const triggersOf = ({ opportunity }: Pick<Target, 'opportunity'>) => opportunity?.triggers ?? 1

/** Of targets of which `atLeast` are done, those that take longest: whichever are done then, the hours suffice. */
function longest(
  targets: readonly Target[],
  atLeast: number,
  seconds: (target: Target) => number,
): Set<number> {
  const ordered = [...targets].sort(
    (a, b) => seconds(b) - seconds(a) || a.position - b.position || a.id - b.id,
  )
  return new Set(ordered.slice(0, atLeast).map(({ id }) => id))
}

/**
 * How often the hours of each target count in those a proposal asks for, by the target's key. Once as a rule; never
 * for a backup, which takes hours that others leave; once for each trigger of a target of opportunity. A group of
 * which at least so many are wanted asks for all it lists, or, where its author says so, for as many as are wanted,
 * those that take longest.
 */
export function timesAsked({ targets, groups, observations }: Contents): Map<number, number> {
  const own = new Map<number, number>()
  for (const { targetId, askedSeconds } of observations)
    own.set(targetId, (own.get(targetId) ?? 0) + askedSeconds)
  const seconds = (target: Target) => (own.get(target.id) ?? 0) * triggersOf(target)
  const counted = new Map<TargetGroup, Set<number>>()
  for (const group of groups) {
    const members = targets.filter((target) => groupOf(target, groups) === group)
    if (group.rule === 'at-least' && group.hoursFor === 'at-least')
      counted.set(group, longest(members, group.atLeast ?? members.length, seconds))
  }
  return new Map(
    targets.map((target) => {
      const group = groupOf(target, groups)
      const isBackup = group ? group.rule === 'backup' : target.need === 'backup'
      const counts = !isBackup && (group && counted.get(group)?.has(target.id)) !== false
      return [target.id, counts ? triggersOf(target) : 0]
    }),
  )
}
