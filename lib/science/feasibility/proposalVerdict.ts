import { nthBest, worst } from './judge'
import type { Verdict } from './types'

/** Targets that stand or fall together. Backups and optional targets never sink a proposal. */
export interface VerdictGroup {
  readonly id: string | number
  readonly need: 'required' | 'optional' | 'backup'
  /** How many of the group must be feasible: all of them, or at least so many. */
  readonly rule: 'all' | { readonly atLeast: number }
  /** One verdict a target, the worst of its observations; null while nothing is asked of it. */
  readonly verdicts: readonly (Verdict | null)[]
}

export interface GroupVerdict {
  readonly id: string | number
  readonly verdict: Verdict
  readonly counts: Readonly<Record<Verdict | 'unasked', number>>
}

export interface ProposalVerdict {
  readonly verdict: Verdict | null
  readonly groups: GroupVerdict[]
}

function count(verdicts: VerdictGroup['verdicts'], which: Verdict | null): number {
  return verdicts.filter((verdict) => verdict === which).length
}

/** A target of which nothing is asked yet may still turn out well: it is counted as marginal. */
function judged({ rule, verdicts }: VerdictGroup): Verdict {
  const known = verdicts.map((verdict) => verdict ?? 'marginal')
  return rule === 'all' ? worst(known) : nthBest(known, rule.atLeast)
}

/**
 * Verdict of a proposal from its groups: the worst of the required ones; without any, the best of the
 * optional ones. Null when there is nothing to judge. It is monotone: no target made better makes it worse.
 */
export function proposalVerdict(groups: readonly VerdictGroup[]): ProposalVerdict {
  const standing = groups
    .filter(({ verdicts }) => verdicts.length > 0)
    .map((group) => ({
      id: group.id,
      need: group.need,
      verdict: judged(group),
      counts: {
        feasible: count(group.verdicts, 'feasible'),
        marginal: count(group.verdicts, 'marginal'),
        'not-feasible': count(group.verdicts, 'not-feasible'),
        unasked: count(group.verdicts, null),
      },
    }))
  const of = (need: VerdictGroup['need']) =>
    standing.filter((group) => group.need === need).map(({ verdict }) => verdict)
  const [required, optional] = [of('required'), of('optional')]
  const verdict = required.length > 0 ? worst(required) : optional.length > 0 ? nthBest(optional, 1) : null
  return { verdict, groups: standing.map(({ id, verdict: own, counts }) => ({ id, verdict: own, counts })) }
}
