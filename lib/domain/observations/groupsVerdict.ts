import { proposalVerdict, type GroupVerdict, type VerdictGroup } from '@/lib/science/feasibility'
import type { Observation, ProposalContents, Target, TargetGroup } from '../proposals/types'
import { groupOf } from './groupOf'
import type { GroupComputation, ObservationComputation, Verdict } from './types'
import { worstVerdict } from './worstVerdict'

interface Contents {
  groups: ProposalContents['groups']
  targets: readonly Pick<Target, 'id' | 'need' | 'group'>[]
  observations: readonly Pick<Observation, 'id' | 'targetId' | 'askedSeconds'>[]
}
type Computed = Pick<ObservationComputation, 'observationId' | 'targetId' | 'verdict' | 'times'>

const ruleOf = ({ rule, atLeast }: TargetGroup): VerdictGroup['rule'] =>
  rule === 'at-least' ? { atLeast: atLeast ?? 1 } : 'all'

/** One verdict a target, the worst of its observations. */
function verdictsOf(computed: readonly Computed[]): ReadonlyMap<number, Verdict> {
  const verdicts = new Map<number, Verdict>()
  for (const { targetId, verdict } of computed)
    verdicts.set(targetId, worstVerdict([verdict, verdicts.get(targetId) ?? verdict]) ?? verdict)
  return verdicts
}

function standingOf(
  { name, rule, atLeast, hoursFor }: TargetGroup,
  size: number,
  own: GroupVerdict | undefined,
  askedSeconds: number,
): GroupComputation {
  return {
    ...{ name, rule, atLeast, hoursFor, size },
    feasible: own?.counts.feasible ?? 0,
    marginal: own?.counts.marginal ?? 0,
    notFeasible: own?.counts['not-feasible'] ?? 0,
    unasked: own?.counts.unasked ?? 0,
    askedSeconds,
    verdict: own?.verdict ?? null,
  }
}

/**
 * The verdict of a whole request by the rules of its targets, and how each group stands. Targets in no group stand by
 * their own word: all the required ones, any of the optional ones, and no backup. Null when nothing is asked for.
 */
export function groupsVerdict(
  { groups, targets, observations }: Contents,
  computed: readonly Computed[],
): { verdict: Verdict | null; groups: GroupComputation[] } {
  const verdicts = verdictsOf(computed)
  const judged = (of: readonly { id: number }[]) => of.map(({ id }) => verdicts.get(id) ?? null)
  const membersOf = (group: TargetGroup | null) =>
    targets.filter((target) => groupOf(target, groups) === group)
  const alone = membersOf(null)
  const optional = judged(alone.filter(({ need }) => need === 'optional'))
  const found = proposalVerdict([
    ...groups.map((group): VerdictGroup => ({
      id: group.id,
      need: group.rule === 'backup' ? 'backup' : 'required',
      rule: ruleOf(group),
      verdicts: judged(membersOf(group)),
    })),
    {
      ...{ id: 'alone', need: 'required', rule: 'all' },
      verdicts: judged(alone.filter(({ need }) => need === 'required')),
    },
    ...optional.flatMap((verdict): VerdictGroup[] =>
      verdict ? [{ id: 'optional', need: 'optional', rule: 'all', verdicts: [verdict] }] : [],
    ),
  ])
  const seconds = new Map(observations.map(({ id, askedSeconds }) => [id, askedSeconds]))
  return {
    verdict: computed.length > 0 ? found.verdict : null,
    groups: groups.map((group) => {
      const members = new Set(membersOf(group).map(({ id }) => id))
      const asked = computed
        .filter(({ targetId }) => members.has(targetId))
        .reduce((sum, { observationId, times }) => sum + times * (seconds.get(observationId) ?? 0), 0)
      return standingOf(
        group,
        members.size,
        found.groups.find(({ id }) => id === group.id),
        asked,
      )
    }),
  }
}
