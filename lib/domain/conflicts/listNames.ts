import { nameKey } from './nameKey'
import { sameNames, type NamedPerson } from './sameNames'
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

/** The list of a call's names as one reviewer sees it: alphabetical, each name once, no proposals. */
export function listNames(
  callId: number,
  named: readonly NamedInvestigator[],
  judge: Judge,
  declared: readonly { kind: InterestKind; note: string }[],
): (ListedName & { person: NamedPerson })[] {
  const own = new Set(judge.institutes.map(fold).filter(Boolean))
  const before = new Map<string, DeclaredKind>()
  for (const { kind, note } of declared)
    if (isDeclared(kind)) for (const name of note.split('; ')) before.set(name, kind)

  return sameNames(named).map((person) => ({
    key: nameKey(callId, person.identity),
    name: person.name,
    institute: person.institute,
    foundAs: person.personIds.has(judge.personId)
      ? 'investigator'
      : own.has(fold(person.institute))
        ? 'institute'
        : null,
    declaredAs: before.get(noteOf(person)) ?? null,
    person,
  }))
}
