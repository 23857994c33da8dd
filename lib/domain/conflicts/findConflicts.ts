import { colleaguesOf } from './colleaguesOf'
import { fold } from './fold'
import { samePeople } from './samePeople'
import { matchedKinds, type BarredPair, type Judge, type MatchedKind, type NamedInvestigator } from './types'

/**
 * Own proposals, those of people who are named with the judge on a proposal of this call or a recent one, and those of
 * the own institute: found by matching accounts, names and institutes. Each pair once, by the weightiest kind.
 * @param named everyone on the proposals of the call
 * @param before everyone on the proposals of recent calls that name one of the judges
 */
export function findConflicts(
  named: readonly NamedInvestigator[],
  judges: readonly Judge[],
  before: readonly NamedInvestigator[] = [],
): (BarredPair & { kind: MatchedKind })[] {
  const found = new Map<string, BarredPair & { kind: MatchedKind }>()
  const add = (personId: number, proposalId: number, kind: MatchedKind) => {
    const key = `${personId}:${proposalId}`
    const known = found.get(key)
    if (known && matchedKinds.indexOf(known.kind) <= matchedKinds.indexOf(kind)) return
    found.set(key, { personId, proposalId, kind, source: 'matched' })
  }
  const people = samePeople([...named, ...before])
  const inCall = new Set(named.map(({ proposalId }) => proposalId))
  for (const { personId: judge, institutes } of judges) {
    const own = new Set(institutes.map(fold).filter(Boolean))
    for (const { proposalId, personId, institute } of named) {
      if (personId === judge) add(judge, proposalId, 'investigator')
      else if (own.has(fold(institute))) add(judge, proposalId, 'institute')
    }
    for (const { proposalIds } of colleaguesOf(judge, people))
      for (const proposalId of proposalIds) if (inCall.has(proposalId)) add(judge, proposalId, 'collaborator')
  }
  return [...found.values()]
}
