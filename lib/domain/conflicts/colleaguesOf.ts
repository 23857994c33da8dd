import type { NamedPerson } from './samePeople'

/** Those who are named with someone on any proposal, without that person; `people` are of this call and recent ones. */
export function colleaguesOf(personId: number, people: readonly NamedPerson[]): Set<NamedPerson> {
  const own = people.filter(({ personIds }) => personIds.has(personId))
  const together = new Set(own.flatMap(({ proposalIds }) => [...proposalIds]))
  return new Set(
    people.filter(
      (person) => !own.includes(person) && [...person.proposalIds].some((proposal) => together.has(proposal)),
    ),
  )
}
