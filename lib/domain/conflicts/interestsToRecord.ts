import { findConflicts } from './findConflicts'
import { noteOf } from './listNames'
import type { NamedPerson } from './samePeople'
import type { BarredPair, DeclaredKind, Judge, NamedInvestigator } from './types'

/** Rows that follow from a declaration: one for each proposal and kind, with every name that was ticked for it. */
export function interestsToRecord(
  judge: Judge,
  named: readonly NamedInvestigator[],
  ticked: readonly { person: NamedPerson; kind: DeclaredKind }[],
  before: readonly NamedInvestigator[],
): (BarredPair & { note: string })[] {
  const declared = new Map<string, BarredPair & { note: string }>()
  for (const { person, kind } of ticked)
    for (const proposalId of person.proposalIds) {
      const key = `${proposalId}:${kind}`
      const note = [declared.get(key)?.note, noteOf(person)].filter(Boolean).join('; ')
      declared.set(key, { personId: judge.personId, proposalId, kind, source: 'declared', note })
    }
  const matched = findConflicts(named, [judge], before).map((pair) => ({ ...pair, note: '' }))
  return [...declared.values(), ...matched]
}
