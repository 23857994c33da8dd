import { fold } from './fold'
import { samePeople, type NamedPerson } from './samePeople'
import type { NamedInvestigator } from './types'

/** The people behind the names on proposals, in alphabetical order. */
export function sameNames(named: readonly NamedInvestigator[]): NamedPerson[] {
  return samePeople(named).sort((a, b) => fold(a.sortName).localeCompare(fold(b.sortName), 'en'))
}
