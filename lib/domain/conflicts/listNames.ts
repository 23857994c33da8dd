import { nameKey } from './nameKey'
import { colleaguesOf } from './colleaguesOf'
import { sameNames } from './sameNames'
import type { NamedPerson } from './samePeople'
import { fold } from './fold'
import {
  declaredKinds,
  type DeclaredKind,
  type InterestKind,
  type Judge,
  type ListedName,
  type NamedInvestigator,
} from './types'

/** How a declared name is kept with the interest: never shown but to the one who declared it. */
export const noteOf = (person: Pick<NamedPerson, 'name' | 'institute'>) =>
  person.institute ? `${person.name}, ${person.institute}` : person.name

const isDeclared = (kind: InterestKind): kind is DeclaredKind => declaredKinds.some((known) => known === kind)

/**
 * The list of a call's names as one reviewer sees it: alphabetical, each name once, no proposals. `before` are the
 * teams of recent calls.
 */
export function listNames(
  callId: number,
  named: readonly NamedInvestigator[],
  judge: Judge,
  declared: readonly { kind: InterestKind; note: string }[],
  before: readonly NamedInvestigator[],
): (ListedName & { person: NamedPerson })[] {
  const own = new Set(judge.institutes.map(fold).filter(Boolean))
  const saidBefore = new Map<string, DeclaredKind>()
  for (const { kind, note } of declared)
    if (isDeclared(kind)) for (const name of note.split('; ')) saidBefore.set(name, kind)

  const all = sameNames([...named, ...before])
  const colleagues = colleaguesOf(judge.personId, all)
  const inCall = new Set(named.map(({ proposalId }) => proposalId))
  return all.flatMap((found) => {
    const proposalIds = new Set([...found.proposalIds].filter((id) => inCall.has(id)))
    if (proposalIds.size === 0) return []
    const person = { ...found, proposalIds }
    return {
      key: nameKey(callId, person.identity),
      name: person.name,
      institute: person.institute,
      foundAs: person.personIds.has(judge.personId)
        ? 'investigator'
        : colleagues.has(found)
          ? 'collaborator'
          : own.has(fold(person.institute))
            ? 'institute'
            : null,
      declaredAs: saidBefore.get(noteOf(person)) ?? null,
      person,
    }
  })
}
