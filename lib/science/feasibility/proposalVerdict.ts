import { nthBest, worst } from './judge'
import type { Verdict } from './types'

/** Targets that stand or fall together. Backups and optional targets never sink a proposal. */
export interface VerdictGroup {
  readonly id: string | number
  readonly need: 'required' | 'optional' | 'backup'
  /** How many of the group must be feasible: all of them, or at least so many. */
  readonly rule: 'all' | { readonly atLeast: number }
  /** One verdict a target, the worst of its observations. */
  readonly verdicts: readonly Verdict[]
}

export interface GroupVerdict {
  readonly id: string | number
  readonly verdict: Verdict
  readonly counts: Readonly<Record<Verdict, number>>
}

export interface ProposalVerdict {
  readonly verdict: Verdict | null
  readonly groups: GroupVerdict[]
}

function count(verdicts: readonly Verdict[], which: Verdict): number {
  return verdicts.filter((verdict) => verdict === which).length
}

/**
 * Verdict of a proposal from its groups: the worst of the required ones; without any, the best of the
 * optional ones. Null when there is nothing to judge.
 */
export function proposalVerdict(groups: readonly VerdictGroup[]): ProposalVerdict {
  const judged = groups
    .filter((group) => group.verdicts.length > 0)
    .map((group) => ({
      id: group.id,
      need: group.need,
      verdict: group.rule === 'all' ? worst(group.verdicts) : nthBest(group.verdicts, group.rule.atLeast),
      counts: {
        feasible: count(group.verdicts, 'feasible'),
        marginal: count(group.verdicts, 'marginal'),
        'not-feasible': count(group.verdicts, 'not-feasible'),
      },
    }))
  const required = judged.filter((group) => group.need === 'required').map((group) => group.verdict)
  const optional = judged.filter((group) => group.need === 'optional').map((group) => group.verdict)
  const verdict = required.length > 0 ? worst(required) : optional.length > 0 ? nthBest(optional, 1) : null
  return { verdict, groups: judged.map(({ id, verdict: own, counts }) => ({ id, verdict: own, counts })) }
}
