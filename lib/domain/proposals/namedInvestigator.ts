import { refuse } from '@/lib/errors'
import type { ProposalSubject } from './policy'
import type { Investigator } from './types'

/** One of the people named on this proposal; an id of another proposal finds nobody. */
export function namedInvestigator(subject: Pick<ProposalSubject, 'people'>, id: number): Investigator {
  const person = subject.people.find((one) => one.id === id)
  if (!person) throw refuse.notFound('investigator')
  return person
}
