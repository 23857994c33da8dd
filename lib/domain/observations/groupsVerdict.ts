import { proposalVerdict, type VerdictGroup } from '@/lib/science/feasibility'
import type { Observation, ProposalContents, Target, TargetGroup } from '../proposals/types'
import type { GroupComputation, ObservationComputation, Verdict } from './types'
import { groupOf } from './groupOf'
import { worstVerdict } from './worstVerdict'

type Contents = {
  groups: ProposalContents['groups']
  targets: readonly Pick<Target, 'id' | 'need' | 'group'>[]
  observations: readonly Pick<Observation, 'id' | 'targetId' | 'askedSeconds'>[]
}
type Computed = Pick<ObservationComputation, 'observationId' | 'targetId' | 'verdict' | 'times'>

const ruleOf = ({ rule, atLeast }: TargetGroup): VerdictGroup['rule'] =>
  rule === 'at-least' ? { atLeast: atLeast ?? 1 } : 'all'

/**
 * The verdict of a whole request by the rules of its targets, and how each group stands. Targets in no group stand by
 * their own word: all the required ones, any of the optional ones, and no backup. Null when nothing is asked for.
 */
export function groupsVerdict(
  { groups, targets, observations }: Contents,
  computed: readonly Computed[],
): { verdict: Verdict | null; groups: GroupComputation[] } {
  const verdictOf = (id: number) =>
    worstVerdict(computed.flatMap(({ targetId, verdict }) => (targetId === id ? [verdict] : [])))
  const membersOf = (group: TargetGroup | null) =>
    targets.filter((target) => groupOf(target, groups) === group)
  const asked = new Map(observations.map(({ id, askedSeconds }) => [id, askedSeconds]))
  const alone = membersOf(null)
  const required = alone.filter(({ need }) => need === 'required')
  const optional = alone.filter(({ need }) => need === 'optional')
  const found = proposalVerdict([
    ...groups.map((group): VerdictGroup => ({
      id: group.name,
      need: group.rule === 'backup' ? 'backup' : 'required',
      rule: ruleOf(group),
      verdicts: membersOf(group).map(({ id }) => verdictOf(id)),
    })),
    { id: 0, need: 'required', rule: 'all', verdicts: required.map(({ id }) => verdictOf(id)) },
    ...optional.flatMap(({ id }): VerdictGroup[] => {
      const verdict = verdictOf(id)
      return verdict ? [{ id, need: 'optional', rule: 'all', verdicts: [verdict] }] : []
    }),
  ])
  return {
    verdict: computed.length > 0 ? found.verdict : null,
    groups: groups.map(({ name, rule, atLeast, hoursFor }) => {
      const own = found.groups.find(({ id }) => id === name)
      const members = new Set(targets.filter((target) => target.group === name).map(({ id }) => id))
      return {
        ...{ name, rule, atLeast, hoursFor, size: members.size },
        feasible: own?.counts.feasible ?? 0,
        marginal: own?.counts.marginal ?? 0,
        notFeasible: own?.counts['not-feasible'] ?? 0,
        unasked: own?.counts.unasked ?? 0,
        askedSeconds: computed
          .filter(({ targetId }) => members.has(targetId))
          .reduce((sum, { observationId, times }) => sum + times * (asked.get(observationId) ?? 0), 0),
        verdict: own?.verdict ?? null,
      }
    }),
  }
}
