import { fold } from './fold'
import type { NamedInvestigator } from './types'

export interface NamedPerson {
  identity: string
  name: string
  sortName: string
  institute: string
  personIds: ReadonlySet<number>
  proposalIds: ReadonlySet<number>
}

const nameKey = (named: NamedInvestigator) => `${fold(named.name)}|${fold(named.institute)}`

/** `Ada van der Brandt` is filed under `Brandt`; a single name under itself. */
function filedUnder(name: string): string {
  const words = name.trim().split(/\s+/)
  return [words.at(-1), ...words.slice(0, -1)].join(' ')
}

/**
 * The people behind the names on proposals, in the order of first mention: one account is one person however the name
 * is spelt, and someone without an account is told apart by name and institute.
 */
export function samePeople(named: readonly NamedInvestigator[]): NamedPerson[] {
  const accounts = new Map<string, number>()
  for (const entry of named) if (entry.personId !== null) accounts.set(nameKey(entry), entry.personId)

  const people = new Map<string, NamedPerson & { personIds: Set<number>; proposalIds: Set<number> }>()
  for (const entry of named) {
    const personId = entry.personId ?? accounts.get(nameKey(entry)) ?? null
    const identity = personId === null ? `name:${nameKey(entry)}` : `person:${personId}`
    const person = people.get(identity) ?? {
      identity,
      name: entry.name,
      sortName: entry.sortName ?? filedUnder(entry.name),
      institute: entry.institute,
      personIds: new Set<number>(),
      proposalIds: new Set<number>(),
    }
    if (personId !== null) person.personIds.add(personId)
    person.proposalIds.add(entry.proposalId)
    people.set(identity, person)
  }
  return [...people.values()]
}
