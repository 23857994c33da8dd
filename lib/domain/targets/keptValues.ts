import { refuse } from '@/lib/errors'
import type { CallKind } from '../calls/types'
import type { TargetGroup } from '../proposals/types'
import { knownGroup } from '../targetGroups/groupRules'
import type { TargetValues } from './types'

/**
 * What a row says as it may be kept in this proposal: its group by the name it is kept under. Refuses a group that is
 * not there, and what is awaited where the kind of proposal takes no targets of opportunity. `at` is where the row
 * stands in the input.
 */
export function keptValues(
  values: TargetValues,
  { kind, groups }: { kind: Pick<CallKind, 'takesAwaited' | 'title'>; groups: readonly TargetGroup[] },
  at: string,
): TargetValues {
  if (values.opportunity && !kind.takesAwaited)
    throw refuse.field(
      `${at}.event`,
      `A proposal of the kind “${kind.title}” takes no targets of opportunity: leave this empty.`,
    )
  return { ...values, group: knownGroup(groups, values.group, `${at}.group`) }
}
