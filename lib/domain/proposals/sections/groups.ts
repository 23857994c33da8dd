import { countInWords } from '@/lib/format'
import { groupOf } from '../../observations/groupOf'
import { needOf } from '../../observations/needOf'
import { groupAnchor } from '../../targetGroups/groupAnchor'
import type { ProposalContents, TargetGroup } from '../types'
import type { Missing } from './finding'

const inWords = (count: number) => countInWords(count, '', '').trim()

/** Groups whose rule cannot hold, and targets of which none is wanted before the others. */
export function groupsLacking(
  { groups, targets }: Pick<ProposalContents, 'groups' | 'targets'>,
  href: string,
): Missing[] {
  const lacks = (sentence: string, group?: TargetGroup): Missing => ({
    section: 'targets',
    field: group ? groupAnchor(group) : null,
    sentence,
    href: group ? `${href}#${groupAnchor(group)}` : href,
  })
  const missing = groups.flatMap((group): Missing[] => {
    const size = targets.filter((target) => groupOf(target, groups) === group).length
    if (size === 0) return [lacks(`Nothing is in ${group.name}: put targets into it, or take it out.`, group)]
    const wanted = group.atLeast ?? 1
    if (group.rule !== 'at-least' || wanted <= size) return []
    return [
      lacks(
        `${group.name} wants ${inWords(wanted)} targets, but ${inWords(size)} ${size === 1 ? 'is' : 'are'} in it.`,
        group,
      ),
    ]
  })
  const hasWanted = targets.some((target) => needOf(target, groups) !== 'backup')
  return hasWanted ? missing : [...missing, lacks('Every target is a backup: say which is wanted first.')]
}
