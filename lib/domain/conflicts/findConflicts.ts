import { fold } from './fold'
import type { BarredPair, Judge, NamedInvestigator } from './types'

/** Own proposals and those of the own institute, found by matching accounts and institutes. */
export function findConflicts(
  named: readonly NamedInvestigator[],
  judges: readonly Judge[],
): (BarredPair & { kind: 'investigator' | 'institute' })[] {
  const found = new Map<string, BarredPair & { kind: 'investigator' | 'institute' }>()
  for (const judge of judges) {
    const institutes = new Set(judge.institutes.map(fold).filter(Boolean))
    for (const { proposalId, personId, institute } of named) {
      const isSelf = personId === judge.personId
      if (!isSelf && !institutes.has(fold(institute))) continue
      const key = `${judge.personId}:${proposalId}`
      // To be an investigator says more than to share an institute.
      if (found.get(key)?.kind === 'investigator') continue
      found.set(key, {
        personId: judge.personId,
        proposalId,
        kind: isSelf ? 'investigator' : 'institute',
        source: 'matched',
      })
    }
  }
  return [...found.values()]
}
